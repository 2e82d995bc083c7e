import { Link, useParams } from 'react-router-dom';
import { adviceFor } from '../features/problems/advice.ts';
import { PageTitle } from '../ui/page-title.tsx';
import { Sheet, SheetHead } from '../ui/sheet.tsx';

export function Component() {
  const { slug = '' } = useParams();
  const advice = adviceFor(slug);
  return (
    <Sheet width="narrow">
      <PageTitle>{advice.title}</PageTitle>
      <SheetHead kicker="What to do about it" title={advice.title} standfirst={advice.means} />
      <section className="section">
        <h2>What to do</h2>
        <ul className="dash-list">
          {advice.steps.map((step) => (
            <li key={step}>{step}</li>
          ))}
        </ul>
        <div className="actions">
          {advice.link && <Link to={advice.link.to}>{advice.link.label}</Link>}
          <Link to="/">To the front page</Link>
        </div>
      </section>
    </Sheet>
  );
}

import { Button } from '@radix-ui/themes';
import { Link, useRouteError } from 'react-router-dom';
import { isProblem, noAnswerProblem, ProblemError, sayProblem } from '../api/problem.ts';
import { PageTitle } from '../ui/page-title.tsx';
import { Sheet, SheetHead } from '../ui/sheet.tsx';

/** A page's own code that cannot be fetched fails as a TypeError: that is silence, not a fault. */
function readFailure(error: unknown): unknown {
  const isSilence = error instanceof TypeError && /fetch|import|load/i.test(error.message);
  return isSilence ? noAnswerProblem() : error;
}

/** A page whose loader or drawing failed. */
export function Failure() {
  const error = readFailure(useRouteError());
  const said = sayProblem(error);
  const isMissing = isProblem(error, 'not-found');
  const title = isMissing ? 'There is no such sheet' : said.title;
  return (
    <Sheet width="narrow">
      <PageTitle>{title}</PageTitle>
      <SheetHead
        title={title}
        standfirst={
          isMissing
            ? 'Nothing is filed under this number, or it is not yours to open.'
            : said.detail
        }
      >
        <div className="actions">
          {!isMissing && <Button onClick={() => window.location.reload()}>Load it again</Button>}
          <Link to="/">To the front page</Link>
          {!isMissing && said.page && <Link to={said.page}>What to do about it</Link>}
        </div>
        {error instanceof ProblemError && error.problem.instance && (
          <p className="fine">
            Quote this when you ask for help:{' '}
            <span className="mono">{error.problem.instance.replace('urn:uuid:', '')}</span>
          </p>
        )}
      </SheetHead>
    </Sheet>
  );
}

import { Button } from '@radix-ui/themes';
import { type ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { sayProblem } from '../api/problem.ts';

/** Ruled lines where text will stand; they appear after 400 ms and do not move. */
export function RuledLines({ what }: { what: string }) {
  const widths = [38, 92, 86, 90, 54];
  return (
    <div className="ruled-lines" aria-busy="true">
      <div aria-hidden="true">
        {widths.map((width) => (
          <i key={width} style={{ width: `${width}%` }} />
        ))}
      </div>
      <p className="visually-hidden" role="status">
        Fetching {what}.
      </p>
    </div>
  );
}

interface StatePanelProps {
  title: string;
  children: ReactNode;
  actions?: ReactNode;
}

/** One line of fact, one of advice, one button. */
export function EmptyState({ title, children, actions }: StatePanelProps) {
  return (
    <section className="state-panel">
      <h2>{title}</h2>
      <p>{children}</p>
      {actions && <div className="actions">{actions}</div>}
    </section>
  );
}

interface FailedProps {
  error: unknown;
  retry?: () => void;
}

/** What failed, what it means, and the way to try again, in the panel that failed. */
export function FailedState({ error, retry }: FailedProps) {
  const said = sayProblem(error);
  return (
    <section className="state-panel" role="alert">
      <h2>{said.title}</h2>
      <p>{said.detail}</p>
      <div className="actions">
        {retry && <Button onClick={retry}>Try again</Button>}
        {said.page && <Link to={said.page}>What to do about it</Link>}
      </div>
    </section>
  );
}

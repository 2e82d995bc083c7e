import { type ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { sayProblem } from '../api/problem.ts';

interface ProblemCalloutProps {
  error: unknown;
  /** Buttons: try again, sign in. */
  actions?: ReactNode;
}

/** A refused request, said in the form that sent it. Shows nothing while nothing is wrong. */
export function ProblemCallout({ error, actions }: ProblemCalloutProps) {
  if (!error) return null;
  const said = sayProblem(error);
  return (
    <div className="problem" role="alert">
      <b>{said.title}</b>
      <p>
        {said.detail} {said.page && <Link to={said.page}>What to do about it</Link>}
      </p>
      {actions && <div className="actions">{actions}</div>}
    </div>
  );
}

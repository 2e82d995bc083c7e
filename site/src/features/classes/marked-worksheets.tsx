import { useState } from 'react';
import { Link } from 'react-router-dom';
import { sayDayAndMonth } from '../../ui/dates.ts';
import { nameOf } from './class-words.ts';
import { type MemberView } from './queries.ts';

interface MarkedWorksheetsProps {
  members: MemberView[];
  /** Only this trainee's. */
  chosen: MemberView | undefined;
}

const shownAtFirst = 8;

/** Marked worksheets to open, the last handed in first. */
export function MarkedWorksheets({ members, chosen }: MarkedWorksheetsProps) {
  const [showsAll, setShowsAll] = useState(false);
  const attempts = (chosen ? [chosen] : members)
    .flatMap((member) => member.attempts.map((attempt) => ({ member, attempt })))
    .sort((a, b) => b.attempt.handedInOn.localeCompare(a.attempt.handedInOn));
  const shown = showsAll ? attempts : attempts.slice(0, shownAtFirst);
  return (
    <section id="marked" aria-labelledby="marked-title">
      <h2 id="marked-title">
        {chosen ? `Marked worksheets of ${nameOf(chosen)}` : 'Marked worksheets'}
      </h2>
      {chosen && (
        <p className="fine">
          <Link to="?" preventScrollReset>
            Of the whole class
          </Link>
        </p>
      )}
      {attempts.length === 0 ? (
        <p className="muted">None handed in yet.</p>
      ) : (
        <ul className="marked-list">
          {shown.map(({ member, attempt }) => (
            <li key={attempt.id}>
              <Link to={`/worksheet-attempts/${attempt.id}`}>
                <b>{nameOf(member)}</b> <span className="mono">{attempt.worksheet}</span>
              </Link>
              <b>
                {attempt.marks} of {attempt.outOf}
              </b>
              <small>
                attempt {attempt.attempt}, {sayDayAndMonth(attempt.handedInOn)}
              </small>
            </li>
          ))}
        </ul>
      )}
      {attempts.length > shown.length && (
        <button type="button" className="text-button" onClick={() => setShowsAll(true)}>
          Show all {attempts.length}
        </button>
      )}
    </section>
  );
}

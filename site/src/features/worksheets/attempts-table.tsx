import { Link } from 'react-router-dom';
import { sayMoment } from '../../ui/dates.ts';
import { Quantity } from '../../ui/quantity.tsx';
import { type WorksheetSummary } from './queries.ts';

type Attempt = WorksheetSummary['attempts'][number];

/** Every attempt of one's own, the last first; each opens exactly as it was. */
export function AttemptsTable({ summary }: { summary: WorksheetSummary }) {
  const attempts = [...summary.attempts].reverse();
  return (
    <section className="section" aria-labelledby="attempts-title">
      <h2 id="attempts-title">Attempts</h2>
      {attempts.length === 0 ? (
        <p className="muted">None yet. Each is kept and opens again exactly as it was.</p>
      ) : (
        <table className="attempts">
          <thead>
            <tr>
              <th scope="col">Attempt</th>
              <th scope="col">State</th>
              <th scope="col" className="number">
                Marks
              </th>
              <th scope="col" className="number">
                Result
              </th>
            </tr>
          </thead>
          <tbody>
            {attempts.map((attempt) => (
              <AttemptRow key={attempt.id} attempt={attempt} passPercent={summary.passPercent} />
            ))}
          </tbody>
        </table>
      )}
    </section>
  );
}

function AttemptRow({ attempt, passPercent }: { attempt: Attempt; passPercent: number }) {
  const { id, handedInAt, startedAt, marks, outOf, percent } = attempt;
  const isPassed = percent !== null && percent >= passPercent;
  return (
    <tr>
      <td>
        <Link to={`/worksheet-attempts/${id}`}>Attempt {attempt.attempt}</Link>
      </td>
      <td>
        {handedInAt ? `handed in ${sayMoment(handedInAt)}` : `open since ${sayMoment(startedAt)}`}
      </td>
      <td className="number">{marks === null ? `of ${outOf}` : `${marks} of ${outOf}`}</td>
      <td className="number">
        {percent !== null && (
          <b className={isPassed ? 'passed' : undefined}>
            <Quantity value={percent} unit="%" />
            <span className="visually-hidden">{isPassed ? ', passed' : ', not passed'}</span>
          </b>
        )}
      </td>
    </tr>
  );
}

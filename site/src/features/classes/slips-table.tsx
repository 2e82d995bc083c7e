import { type ClassView } from './queries.ts';

/** The predicted slips a class makes most, on its first attempts. */
export function SlipsTable({ view: { slips, tooFew } }: { view: ClassView }) {
  return (
    <section id="slips" aria-labelledby="slips-title">
      <h2 id="slips-title">Commonest slips</h2>
      {slips.length === 0 ? (
        <p className="muted">
          {tooFew
            ? 'Fewer than five have answered: too few to say. Slips are counted on first attempts.'
            : 'No slip that the questions foresee, on first attempts.'}
        </p>
      ) : (
        <>
          <p className="fine">
            First attempts on worksheets in this class, of those who answered the part.
          </p>
          <table className="slips">
            <thead>
              <tr>
                <th scope="col">Part</th>
                <th scope="col">Slip</th>
                <th scope="col" className="number">
                  Trainees
                </th>
              </tr>
            </thead>
            <tbody>
              {slips.map(({ question, part, says, count, of }) => (
                <tr key={`${question} ${part} ${says}`}>
                  <td>
                    {question} <span className="mono">({part})</span>
                  </td>
                  <td>{says}</td>
                  <td className="number">
                    <b>{count}</b> of {of}
                  </td>
                </tr>
              ))}
            </tbody>
          </table>
        </>
      )}
    </section>
  );
}

import { upperFirst } from '../../ui/words.ts';
import { MarkCells } from '../../ui/mark-cells.tsx';
import { type ResultView } from './queries.ts';
import { sayWhereLost } from './say-marks.ts';

/** Where the marks went, by subject. */
export function MarksTable({ result }: { result: ResultView }) {
  const said = sayWhereLost(result);
  return (
    <>
      <table className="marks-table">
        <caption className="visually-hidden">Marks by subject</caption>
        <thead>
          <tr>
            <th scope="col">Subject</th>
            <th scope="col">Marks</th>
            <th scope="col" className="number">
              Got
            </th>
            <th scope="col" className="number">
              Of
            </th>
          </tr>
        </thead>
        <tbody>
          {result.bySubject.map(({ subject, name, marks, outOf }) => (
            <tr key={subject}>
              <th scope="row">{upperFirst(name)}</th>
              <td className="cells">
                <MarkCells gained={marks} outOf={outOf} label={`${marks} of ${outOf} marks`} />
              </td>
              <td className="number got">{marks}</td>
              <td className="number of">{outOf}</td>
            </tr>
          ))}
        </tbody>
        <tfoot>
          <tr>
            <th scope="row">In all</th>
            <td className="cells" />
            <td className="number got">{result.marks}</td>
            <td className="number of">{result.outOf}</td>
          </tr>
        </tfoot>
      </table>
      {said && <p className="fine">{said}</p>}
    </>
  );
}

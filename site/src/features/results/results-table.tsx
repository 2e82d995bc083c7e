import { Link } from 'react-router-dom';
import { sayDate } from '../../ui/dates.ts';
import { OpenRingSign, TickSign } from '../../ui/symbols/signs.tsx';
import { type ResultRow } from './queries.ts';

interface ResultsTableProps {
  results: ResultRow[];
  selectedId: string | null;
  linkTo: (id: string) => string;
}

/** Every sitting that was handed in, newest first. */
export function ResultsTable({ results, selectedId, linkTo }: ResultsTableProps) {
  return (
    <table className="results-table">
      <caption className="visually-hidden">Results</caption>
      <thead>
        <tr>
          <th scope="col">Candidate</th>
          <th scope="col">Sat</th>
          <th scope="col">Handed in</th>
          <th scope="col" className="number">
            Per cent
          </th>
          <th scope="col">Result</th>
          <th scope="col" className="number">
            Looks
          </th>
        </tr>
      </thead>
      <tbody>
        {results.map((row) => (
          <tr key={row.id} className={row.id === selectedId ? 'selected' : undefined}>
            <th scope="row">
              <Link
                to={linkTo(row.id)}
                preventScrollReset
                aria-current={row.id === selectedId || undefined}
              >
                {row.name}
              </Link>
            </th>
            <td className="sat">{sayDate(row.satOn)}</td>
            <td className="how">
              {row.handedInHow === 'by-candidate' ? 'By candidate' : 'At the deadline'}
            </td>
            <td className="number percent">{row.percent === null ? '–' : `${row.percent} %`}</td>
            <td className="outcome">
              <Outcome passed={row.passed} />
            </td>
            <td className="number looks">{row.looks}</td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}

function Outcome({ passed }: { passed: boolean | null }) {
  if (passed === null) return <span className="muted">Being marked</span>;
  return passed ? (
    <>
      <TickSign className="passed" />
      Passed
    </>
  ) : (
    <>
      <OpenRingSign />
      Not passed
    </>
  );
}

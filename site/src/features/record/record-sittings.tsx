import { Link } from 'react-router-dom';
import { type Answer } from '../../api/views.ts';
import { sayDate } from '../../ui/dates.ts';

type PaperView = Answer<'Papers_paper'>;
type SittingOfRecord = PaperView['standing']['sittings'][number];

/** Every sitting of the paper, the open one first. */
export function RecordSittings({ paper }: { paper: PaperView }) {
  const { standing } = paper;
  if (standing.sittings.length === 0) {
    return (
      <p>
        Not sat yet. <Link to={`/papers/${paper.slug}`}>What {paper.title.toLowerCase()} asks</Link>
      </p>
    );
  }
  return (
    <>
      <table className="record-table">
        <caption className="visually-hidden">Sittings</caption>
        <thead>
          <tr>
            <th scope="col">Paper</th>
            <th scope="col">Sat</th>
            <th scope="col">Result</th>
          </tr>
        </thead>
        <tbody>
          {standing.sittings.map((sitting) => (
            <tr key={sitting.id}>
              <th scope="row">
                <Link to={pathOf(sitting)}>
                  {paper.number}, {paper.title}
                </Link>
              </th>
              <td>{sayDate(sitting.startedAt)}</td>
              <td className={sitting.passed ? 'passed' : undefined}>{saySitting(sitting)}</td>
            </tr>
          ))}
        </tbody>
      </table>
      {standing.state === 'waiting' && standing.mayStartAt && (
        <p className="fine">
          You may sit again from {sayDate(standing.mayStartAt)}.{' '}
          <Link to={`/papers/${paper.slug}`}>The paper’s page</Link>
        </p>
      )}
    </>
  );
}

const isOpen = ({ handedInAt }: SittingOfRecord) => handedInAt === null;

function pathOf(sitting: SittingOfRecord): string {
  return isOpen(sitting) ? `/sittings/${sitting.id}?q=1` : `/sittings/${sitting.id}/result`;
}

function saySitting(sitting: SittingOfRecord): string {
  if (isOpen(sitting)) return 'Open, the clock is running';
  if (sitting.passed === null) return 'Being marked';
  return sitting.passed ? 'Passed' : 'Not passed';
}

import { Link } from 'react-router-dom';
import { sayTimeOfDay } from '../../ui/dates.ts';
import { type Standing } from '../../ui/question/views.ts';
import { PennantSign } from '../../ui/symbols/signs.tsx';
import { Terminal } from '../../ui/symbols/terminal.tsx';
import { type SittingItem } from './queries.ts';
import { terminalOf } from './question-terminals.tsx';
import { sayStanding } from './review-words.ts';
import { type SittingDesk } from './sitting-desk.ts';

type ReviewTableProps = Pick<SittingDesk, 'sitting' | 'standings' | 'state' | 'pennants'>;

/** Every question with its state, what was last written and its receipt; blanks are tinted. */
export function ReviewTable({ sitting, standings, ...rest }: ReviewTableProps) {
  return (
    <table className="review-table">
      <caption className="visually-hidden">Questions of this paper</caption>
      <thead>
        <tr>
          <th scope="col">Question</th>
          <th scope="col">Title</th>
          <th scope="col" className="number">
            Marks
          </th>
          <th scope="col">State</th>
          <th scope="col">Last written</th>
          <th scope="col">Receipt</th>
          <th scope="col">
            <span className="visually-hidden">Come back to</span>
          </th>
        </tr>
      </thead>
      <tbody>
        {sitting.items.map((item, index) => (
          <ReviewRow
            key={item.key}
            {...rest}
            sittingId={sitting.id}
            item={item}
            standing={standings[index] ?? 'not'}
          />
        ))}
      </tbody>
      <tfoot>
        <tr>
          <td />
          <th scope="row">In all</th>
          <td className="number">{sitting.marks}</td>
          <td colSpan={4} />
        </tr>
      </tfoot>
    </table>
  );
}

interface ReviewRowProps extends Pick<SittingDesk, 'state' | 'pennants'> {
  sittingId: string;
  item: SittingItem;
  standing: Standing;
}

function ReviewRow({ sittingId, item, standing, state, pennants }: ReviewRowProps) {
  const last = lastWritten(item, state.receipts);
  return (
    <tr className={standing === 'answered' ? undefined : 'unfinished'}>
      <td className="question-number">{item.number}</td>
      <th scope="row">
        <Link to={`/sittings/${sittingId}?q=${item.number}`}>{item.question.title}</Link>
      </th>
      <td className="number">{item.question.marks}</td>
      <td className="state">
        <span>
          <Terminal state={terminalOf[standing]} width={44} />
          {sayStanding(item, standing, state)}
        </span>
      </td>
      <td className="written">{last ? sayTimeOfDay(last.savedAt) : '–'}</td>
      <td className="receipt mono">{last?.receipt ?? '–'}</td>
      <td className="come-back">
        {pennants[item.key] && (
          <>
            <PennantSign /> Come back to
          </>
        )}
      </td>
    </tr>
  );
}

type Written = Pick<SittingDesk['state']['receipts'][number], 'savedAt' | 'receipt'>;

/** Only the latest receipts come with the paper; an answer of before carries its own. */
function lastWritten(
  item: SittingItem,
  receipts: SittingDesk['state']['receipts'],
): Written | undefined {
  const ofNow = receipts.find((receipt) => receipt.item === item.number);
  if (ofNow) return ofNow;
  const kept = Object.values(item.answers);
  return kept.sort((one, other) => other.savedAt.localeCompare(one.savedAt))[0];
}

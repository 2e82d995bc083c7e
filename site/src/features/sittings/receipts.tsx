import { sayTimeOfDay } from '../../ui/dates.ts';
import { OpenRingSign } from '../../ui/symbols/signs.tsx';
import { type DeskState } from './answer-desk.ts';

const mostShown = 4;

/** What was kept, when, and the receipt to quote. */
export function Receipts({ state }: { state: DeskState }) {
  const isWaiting = state.cut !== null && state.waiting > 0;
  return (
    <section className="receipts">
      <div>
        <h2>Receipts</h2>
        <p className="muted">
          Each answer you leave is kept and gets a receipt. If anything goes missing, quote it.
        </p>
      </div>
      <table>
        <caption className="visually-hidden">The latest receipts</caption>
        <thead>
          <tr>
            <th scope="col">Written</th>
            <th scope="col">Answer</th>
            <th scope="col">Receipt</th>
          </tr>
        </thead>
        <tbody>
          {isWaiting && (
            <tr>
              <td>–</td>
              <td>
                {state.waiting} {state.waiting === 1 ? 'answer' : 'answers'}
              </td>
              <td className="pen">
                <OpenRingSign /> waiting
              </td>
            </tr>
          )}
          {state.receipts.slice(0, mostShown).map((receipt) => (
            <tr key={receipt.receipt}>
              <td>{sayTimeOfDay(receipt.savedAt)}</td>
              <td>
                {receipt.item} ({receipt.part})
              </td>
              <td className="mono">{receipt.receipt}</td>
            </tr>
          ))}
          {!isWaiting && state.receipts.length === 0 && (
            <tr>
              <td colSpan={3}>Nothing written yet.</td>
            </tr>
          )}
        </tbody>
      </table>
    </section>
  );
}

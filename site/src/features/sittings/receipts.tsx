import { sayTimeOfDay } from '../../ui/dates.ts';
import { type DeskState } from './answer-desk.ts';

const mostShown = 6;

/** What was kept, when, and the receipt to quote. */
export function Receipts({ state }: { state: DeskState }) {
  return (
    <section className="receipts">
      <div>
        <h2>Receipts</h2>
        <p className="muted">
          Each answer you leave is kept and gets a receipt. If anything goes missing, quote it.
        </p>
      </div>
      <table>
        <thead>
          <tr>
            <th scope="col">Written</th>
            <th scope="col">Answer</th>
            <th scope="col">Receipt</th>
          </tr>
        </thead>
        <tbody>
          {state.waiting > 0 && (
            <tr>
              <td>–</td>
              <td>{state.waiting} on this device</td>
              <td>waiting</td>
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
          {state.waiting === 0 && state.receipts.length === 0 && (
            <tr>
              <td colSpan={3}>Nothing written yet.</td>
            </tr>
          )}
        </tbody>
      </table>
    </section>
  );
}

import { QuantitySymbol, Quantity } from '../quantity.tsx';
import { type GivenView } from './views.ts';

/** What the question states: symbol, what it is, value and unit. */
export function GivenTable({ given }: { given: readonly GivenView[] }) {
  return (
    <table className="given">
      <caption>Given</caption>
      <tbody>
        {given.map((row) => (
          <tr key={row.label}>
            <td>{row.symbol && <QuantitySymbol text={row.symbol} />}</td>
            <th scope="row">{row.label}</th>
            <td className="number">
              <Quantity value={row.value} unit={row.unit} />
            </td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}

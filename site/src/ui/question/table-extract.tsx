import { ScrollTable } from '../scroll-table.tsx';
import './table-extract.css';
import { type TableView } from './views.ts';

const mostBesideAnother = 4;

/** An extract of a printed table: caption above, units in the heads, source below. */
export function TableExtract({ table }: { table: TableView }) {
  return (
    <figure
      className={
        table.columns.length > mostBesideAnother ? 'table-extract across' : 'table-extract'
      }
    >
      <ScrollTable label={table.caption}>
        <caption>{table.caption}</caption>
        <thead>
          <tr>
            {table.columns.map(({ label, unit }) => (
              <th key={label} scope="col" className="number">
                {label} {unit && <span>{unit}</span>}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {table.rows.map(([first, ...others], index) => (
            <tr key={index}>
              <th scope="row" className="number">
                {first}
              </th>
              {others.map((figure, place) => (
                <td key={place} className="number">
                  {figure}
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </ScrollTable>
      <figcaption className="fine">Source: {table.source}</figcaption>
    </figure>
  );
}

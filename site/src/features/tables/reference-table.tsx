import { type TableView } from './queries.ts';

/** One table with what it assumes, its caution and where its figures come from. */
export function ReferenceTable({ table, number }: { table: TableView; number: number }) {
  const { slug, title, note, caution, sources } = table;
  return (
    <section className="reference-table" id={slug} aria-labelledby={`${slug}-title`}>
      <h2 id={`${slug}-title`}>
        <b>{number}</b> {title}
      </h2>
      <p className="table-note">{note}</p>
      <FiguresTable table={table} />
      <div className="table-notes">
        {caution && (
          <p role="note">
            <b>Before you use it</b> {caution}
          </p>
        )}
        <p>
          <b>Sources</b>{' '}
          {sources.map(({ text, provenance }) => `${text} (${provenance})`).join('; ')}.
        </p>
      </div>
    </section>
  );
}

function FiguresTable({ table: { title, columns, rows } }: { table: TableView }) {
  const areNumbers = columns.map((_, index) => rows.every(({ cells }) => isNumber(cells[index])));
  return (
    // A wide table scrolls sideways on a phone, so the keyboard must reach it.
    // eslint-disable-next-line jsx-a11y/no-noninteractive-tabindex
    <div className="table-scroll" role="group" aria-label={title} tabIndex={0}>
      <table>
        <thead>
          <tr>
            {columns.map(({ label, unit }, index) => (
              <th
                key={`${label} ${unit}`}
                scope="col"
                className={areNumbers[index] ? 'number' : undefined}
              >
                {unit ? `${label}, ${unit}` : label}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map(({ cells: [head = '', ...cells] }) => (
            <tr key={head}>
              <th scope="row" className={areNumbers[0] ? 'number' : undefined}>
                {head}
              </th>
              {cells.map((cell, index) => (
                <td key={index} className={areNumbers[index + 1] ? 'number' : undefined}>
                  {cell || <Nothing />}
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}

const isNumber = (cell = '') => cell === '' || /^\u2212?[\d.]+(\/0)?$/.test(cell);

function Nothing() {
  return (
    <>
      <span aria-hidden="true" className="muted">
        ·
      </span>
      <span className="visually-hidden">none</span>
    </>
  );
}

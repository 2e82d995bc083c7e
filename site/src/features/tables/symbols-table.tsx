import { type SymbolsView } from './queries.ts';

/** The symbols of the drawings, in words. */
export function SymbolsTable({ symbols, number }: { symbols: SymbolsView; number: number }) {
  return (
    <section className="reference-table symbols-table" id="symbols" aria-labelledby="symbols-title">
      <h2 id="symbols-title">
        <b>{number}</b> Symbols of the drawings
      </h2>
      {/* eslint-disable-next-line jsx-a11y/no-noninteractive-tabindex */}
      <div className="table-scroll" role="group" aria-label="Symbols of the drawings" tabIndex={0}>
        <table>
          <thead>
            <tr>
              <th scope="col">Symbol</th>
              <th scope="col">Letter</th>
              <th scope="col">Looks like</th>
              <th scope="col">Means</th>
            </tr>
          </thead>
          <tbody>
            {symbols.list.map(({ slug, letter, name, looks, means }) => (
              <tr key={slug} id={`symbol-${slug}`}>
                <th scope="row">{name}</th>
                <td>{letter}</td>
                <td>{looks}</td>
                <td>{means}</td>
              </tr>
            ))}
          </tbody>
        </table>
      </div>
      <div className="table-notes">
        <p>
          <b>Sources</b> {symbols.source}
        </p>
      </div>
    </section>
  );
}

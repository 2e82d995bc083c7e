export interface Cell<Content> {
  label: string;
  value: Content;
  /** Sixths of the row; two unless said. */
  span?: 1 | 2 | 3 | 4 | 6;
  kind?: 'strong' | 'scored';
}

interface PlacedCell<Content> extends Cell<Content> {
  className: string;
}

const sixths = 6;

/** Lays cells in rows of six columns and says which edges each shares with the frame. */
export function placeCells<Content>(cells: Cell<Content>[]): PlacedCell<Content>[] {
  let column = 0;
  let row = 0;
  const places = cells.map((cell) => {
    const span = cell.span ?? 2;
    if (column + span > sixths) {
      row += 1;
      column = 0;
    }
    const place = { row, start: column === 0, end: column + span === sixths };
    column += span;
    return place;
  });
  return cells.map((cell, index) => {
    const place = places[index];
    const names = [
      `span-${cell.span ?? 2}`,
      cell.kind,
      place?.start && 'row-start',
      place?.end && 'row-end',
      place?.row === 0 && 'first-row',
      place?.row === row && 'last-row',
    ];
    return { ...cell, className: names.filter(Boolean).join(' ') };
  });
}

/** How far a figure can be trusted, in the words the course uses. */
export type Provenance =
  'read' | 'second-hand copy' | 'from memory' | 'computed' | 'common practice';

/** A table to look things up in, as it is printed; the first column heads its row. */
export interface ReferenceTable {
  readonly slug: string;
  readonly title: string;
  /** What it is for and what it assumes. */
  readonly note: string;
  readonly columns: readonly { readonly label: string; readonly unit: string }[];
  /** Cells as printed; empty where the table has no figure. */
  readonly rows: readonly { readonly cells: readonly string[] }[];
  readonly sources: readonly { readonly text: string; readonly provenance: Provenance }[];
  readonly caution: string | null;
}

export const column = (label: string, unit = ''): ReferenceTable['columns'][number] => ({
  label,
  unit,
});

export const row = (...cells: string[]): ReferenceTable['rows'][number] => ({ cells });

/** So many significant figures, noughts kept, as standards print them. */
export const figures = (value: number, count: number): string => {
  const rounded = Number(value.toPrecision(count));
  const whole = Math.floor(Math.log10(Math.abs(rounded)) + 1e-12);
  return rounded.toFixed(Math.max(0, count - 1 - whole));
};

/** What a look-up gives, or an empty cell where the table has nothing. */
export function cellOf(look: () => string): string {
  try {
    return look();
  } catch (error) {
    if (error instanceof Error && error.name === 'OutOfRange') return '';
    throw error;
  }
}

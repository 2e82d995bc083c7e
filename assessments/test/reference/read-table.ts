import { readFileSync } from 'node:fs';

/** Rows of a reference table by their column names; lines beginning with # say where it is from. */
export function readTable(name: string): Record<string, string>[] {
  const [header = '', ...rows] = readFileSync(new URL(name, import.meta.url), 'utf8')
    .split('\n')
    .filter((line) => line !== '' && !line.startsWith('#'));
  const columns = header.split(',');
  return rows.map((row) => {
    const cells = row.split(',');
    return Object.fromEntries(columns.map((column, index) => [column, cells[index] ?? '']));
  });
}

/** A cell as a number; an empty one is NaN. */
export function numberIn(row: Record<string, string>, column: string): number {
  const cell = row[column];
  return cell === undefined || cell === '' ? NaN : Number(cell);
}

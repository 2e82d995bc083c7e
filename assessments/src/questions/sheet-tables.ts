import { readAuthorFigure } from './author-figure.ts';
import { type Table } from './compiled.ts';
import { type Expr } from './expression.ts';
import { attempt, type Desk, inField } from './sheet-desk.ts';
import { type Sheet } from './sheet-schema.ts';
import { parseUnit } from './unit-expression.ts';
import { type Dimension, sameDimension, toSi, type Unit } from './units.ts';

type SheetTable = Sheet['tables'][string];
export type SheetLookUp = NonNullable<Sheet['steps'][string]['look up']>;

/** The table extracts of a sheet. */
export function readTables(desk: Desk): Table[] {
  return Object.entries(desk.sheet.tables).flatMap(([name, entry]) =>
    attempt(desk, ['tables', name], () => readTable(desk, name, entry)),
  );
}

function readTable(desk: Desk, name: string, entry: SheetTable): Table {
  const columns = Object.entries(entry.columns).map(([column, { is, unit }]) => ({
    name: column,
    label: is,
    unit: inField(['columns', column], () => parseUnit(unit)),
  }));
  const rows = entry.rows.flatMap((cells, index) =>
    attempt(desk, ['tables', name, 'rows', index], () => {
      if (cells.length !== columns.length) {
        throw new Error(
          `A row of ${cells.length} cells under ${columns.length} columns; write ${columns.length}, with null for an empty one.`,
        );
      }
      return cells.map((cell, place) => cellFigure(cell, columns[place]?.unit));
    }),
  );
  return { name, caption: entry.caption, source: entry.source, columns, rows };
}

function cellFigure(cell: string | null, unit: Unit | undefined): number | null {
  if (cell === null) return null;
  const gauge = unit?.symbol === 'AWG' ? /^([1-4])\/0$/.exec(cell) : null;
  if (gauge) return 1 - Number(gauge[1]);
  const read = readAuthorFigure(cell);
  if (read.unit.symbol === '' || read.unit.symbol === unit?.symbol) return read.figure;
  throw new Error(
    `"${cell}" is not in ${unit?.symbol || 'a pure number'}; write its figure alone.`,
  );
}

/** A column by its path, such as "pull.gauge". */
export function columnAt(
  path: string,
  tables: readonly Table[],
): { unit: Unit; figures: number[] } {
  const [tableName = '', columnName = ''] = path.split('.');
  const table = tableNamed(tableName, tables);
  const place = placeOf(columnName, table);
  const figures = table.rows.flatMap((row) => row[place] ?? []);
  return { unit: unitAt(table, place), figures: [...new Set(figures)] };
}

interface LookUpScope {
  tables: readonly Table[];
  dimensions: ReadonlyMap<string, Dimension>;
}

/**
 * A look-up as an expression: its figures come along, so that nothing else is needed to work it.
 *
 * @throws {Error} when it names a table, column or value that is not there, or of another kind.
 */
export function readLookUp(
  entry: SheetLookUp & { 'rows off'?: number },
  { tables, dimensions }: LookUpScope,
): Extract<Expr, { kind: 'look' }> {
  const table = tableNamed(entry.table, tables);
  const where = placeOf(entry.where, table);
  const column = placeOf(entry.column, table);
  const dimension = dimensions.get(entry.is);
  if (!dimension) {
    throw new Error(`"${entry.is}" under is names no value declared before this line.`);
  }
  const key = unitAt(table, where);
  if (!sameDimension(dimension, key.dimension)) {
    throw new Error(
      `${entry.is} is another kind of quantity than column ${entry.where}, in ${key.symbol || 'no unit'}.`,
    );
  }
  const unit = unitAt(table, column);
  const cells = (place: number, of: Unit): (number | null)[] =>
    table.rows.map((row) => inSi(row[place] ?? null, of));
  return {
    kind: 'look',
    table: table.name,
    caption: table.caption,
    column: table.columns[column]?.label ?? '',
    keys: cells(where, key),
    results: cells(column, unit),
    unit,
    of: { kind: 'name', name: entry.is },
    off: entry['rows off'] ?? 0,
  };
}

function inSi(cell: number | null, unit: Unit): number | null {
  return cell === null ? null : toSi(cell, unit);
}

function tableNamed(name: string, tables: readonly Table[]): Table {
  const table = tables.find((one) => one.name === name);
  if (table) return table;
  const names = tables.map((one) => one.name).join(', ');
  throw new Error(`No table ${name}; ${names ? `use one of ${names}` : 'add it under tables'}.`);
}

function placeOf(column: string, table: Table): number {
  const place = table.columns.findIndex(({ name }) => name === column);
  if (place >= 0) return place;
  const names = table.columns.map(({ name }) => name).join(', ');
  throw new Error(`Table ${table.name} has no column ${column}; use one of ${names}.`);
}

function unitAt(table: Table, place: number): Unit {
  return table.columns[place]?.unit ?? parseUnit('');
}

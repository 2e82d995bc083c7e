import { type Given, type Step, type Table } from './compiled.ts';
import { dimensionOf, outcomeOf } from './dimensions.ts';
import { type Expr, readExpression } from './expression.ts';
import { attempt, declare, type Desk } from './sheet-desk.ts';
import { readGiven } from './sheet-givens.ts';
import { type Sheet } from './sheet-schema.ts';
import { readLookUp } from './sheet-tables.ts';
import { parseUnit } from './unit-expression.ts';
import { type Dimension, sameDimension } from './units.ts';

/** The given values of a sheet, each declared with its dimension. */
export function readGivens(desk: Desk, tables: readonly Table[]): Given[] {
  return Object.entries(desk.sheet.given).flatMap(([name, entry]) =>
    attempt(desk, ['given', name], () => {
      const given = readGiven(name, entry, tables);
      declare(desk, name, given.unit.dimension);
      return given;
    }),
  );
}

/** Curve readings first: sums may lean on them, never the other way. */
export function readSteps(
  desk: Desk,
  { givens, tables }: { givens: readonly Given[]; tables: readonly Table[] },
): Step[] {
  const curve = desk.sheet.curve;
  const reads = Object.entries(curve?.reads ?? {}).flatMap(([name, entry]) =>
    attempt(desk, ['curve', 'reads', name], (): Step => {
      const { at, of: kind, because, says = null, ...rest } = entry;
      const needsTime = kind.endsWith(' at');
      if (needsTime !== (at !== undefined) || (at && !givens.some((g) => g.name === at))) {
        throw new Error('A reading "… at" names the given that holds its time, others name none.');
      }
      const unit = parseUnit(rest.unit);
      declare(desk, name, unit.dimension);
      const read = (needsTime ? { kind, at } : { kind }) as Extract<
        Step['how'],
        { kind: 'read' }
      >['read'];
      return { ...rest, name, unit, says, how: { kind: 'read', read, because } };
    }),
  );
  const sums = Object.entries(desk.sheet.steps).flatMap(([name, entry]) =>
    attempt(desk, ['steps', name], () => readSum(desk, { name, entry, tables })),
  );
  return [...reads, ...sums];
}

interface StepEntry {
  name: string;
  entry: Sheet['steps'][string];
  tables: readonly Table[];
}

function readSum(desk: Desk, { name, entry, tables }: StepEntry): Step {
  const unit = parseUnit(entry.unit);
  try {
    const expr = readHow(desk, entry, tables);
    if (!sameDimension(dimensionOf(expr, desk.dimensions), unit.dimension)) {
      const what = entry.is === undefined ? 'column' : 'sum';
      throw new Error(
        `The ${what} does not come out in ${unit.symbol || 'a pure number'}; check it.`,
      );
    }
    const { symbol, says = null, figures } = entry;
    return { name, symbol, says, unit, figures, how: { kind: 'sum', expr } };
  } finally {
    // Declared even when its sum is wrong, so that one mistake is not reported at every later line.
    declare(desk, name, unit.dimension);
  }
}

function readHow(desk: Desk, entry: StepEntry['entry'], tables: readonly Table[]): Expr {
  const { is, 'look up': look } = entry;
  if (is !== undefined && look === undefined) {
    return readExpression(is, new Set(desk.dimensions.keys()));
  }
  if (is === undefined && look !== undefined) {
    return readLookUp(look, { tables, dimensions: desk.dimensions });
  }
  throw new Error('A step is worked by one of: is, a sum; look up, in a table.');
}

/**
 * Reads a condition over declared names.
 *
 * @throws {Error} when it is no comparison.
 */
export function conditionIn(text: string, dimensions: ReadonlyMap<string, Dimension>): Expr {
  const expr = readExpression(text, new Set(dimensions.keys()));
  if (outcomeOf(expr, dimensions).kind === 'condition') return expr;
  throw new Error(`"${text}" is not a comparison; write one like share > 0.01.`);
}

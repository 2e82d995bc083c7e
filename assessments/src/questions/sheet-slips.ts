import { type Part, type Slip, type Step, type Table } from './compiled.ts';
import { dimensionOf } from './dimensions.ts';
import { type Expr, readExpression } from './expression.ts';
import { type Sheet } from './sheet-schema.ts';
import { readLookUp } from './sheet-tables.ts';
import { type Dimension, sameDimension } from './units.ts';

type SheetSlip = Sheet['slips'][number];

interface SlipScope {
  parts: readonly Part[];
  steps: readonly Step[];
  tables: readonly Table[];
  /** As the sheet has them: a wrong look-up takes from the right one what it leaves out. */
  sheet: Sheet;
  dimensions: ReadonlyMap<string, Dimension>;
}

/**
 * Turns one entry of `slips` into predictions for the steps that are asked for.
 *
 * @throws {Error} when it predicts a step nobody asks for, or keeps all of a part's marks.
 */
export function readSlip(slip: SheetSlip, scope: SlipScope): Slip {
  const { is, say, credit = null, makes, keep } = slip;
  for (const step of Object.keys(keep)) {
    if (!Object.hasOwn(makes, step)) throw new Error(`keep names ${step}, which it does not make.`);
  }
  const predictions = Object.entries(makes).map(([step, wrong]) => {
    const part = scope.parts.find((one) => 'step' in one && one.step === step);
    const target = scope.steps.find((one) => one.name === step);
    if (!part || !target) throw new Error(`No part asks for ${step}; predict a step of a part.`);
    const kept = keep[step] ?? 0;
    if (kept >= part.marks) throw new Error(`A slip keeps ${kept} of ${part.marks}; keep fewer.`);
    const expr = readWrong(step, wrong, scope);
    if (!sameDimension(dimensionOf(expr, scope.dimensions), target.unit.dimension)) {
      throw new Error(`The sum for ${step} does not come out in ${target.unit.symbol}; check it.`);
    }
    return { step, expr, keep: kept };
  });
  if (predictions.length === 0) throw new Error('A slip predicts at least one wrong value.');
  return { is, say, credit, makes: predictions };
}

function readWrong(step: string, wrong: SheetSlip['makes'][string], scope: SlipScope): Expr {
  if (typeof wrong === 'string') return readExpression(wrong, new Set(scope.dimensions.keys()));
  const right = scope.sheet.steps[step]?.['look up'];
  const { table, column, where, is } = { ...right, ...stated(wrong['look up']) };
  if (table === undefined || column === undefined || where === undefined || is === undefined) {
    throw new Error(`${step} is no look-up; give table, column, where and is.`);
  }
  const off = wrong['look up']['rows off'];
  const isRight = Object.keys(stated(wrong['look up'])).every((key) => key === 'rows off');
  if (isRight && off === 0) throw new Error(`The look-up for ${step} is the right one; change it.`);
  return readLookUp({ table, column, where, is, 'rows off': off }, scope);
}

function stated<T extends object>(entry: T): Partial<T> {
  return Object.fromEntries(
    Object.entries(entry).filter(([, value]) => value !== undefined),
  ) as Partial<T>;
}

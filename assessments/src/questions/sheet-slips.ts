import { type Part, type Slip, type Step } from './compiled.ts';
import { dimensionOf } from './dimensions.ts';
import { readExpression } from './expression.ts';
import { type Sheet } from './sheet-schema.ts';
import { type Dimension, sameDimension } from './units.ts';

interface SlipScope {
  parts: readonly Part[];
  steps: readonly Step[];
  dimensions: ReadonlyMap<string, Dimension>;
}

/**
 * Turns one entry of `slips` into predictions for the steps that are asked for.
 *
 * @throws {Error} when it predicts a step nobody asks for, or keeps all of a part's marks.
 */
export function readSlip(slip: Sheet['slips'][number], scope: SlipScope): Slip {
  const { is, say, credit = null, makes, keep } = slip;
  for (const step of Object.keys(keep)) {
    if (!Object.hasOwn(makes, step)) throw new Error(`keep names ${step}, which it does not make.`);
  }
  const predictions = Object.entries(makes).map(([step, sum]) => {
    const part = scope.parts.find((one) => one.kind !== 'choice' && one.step === step);
    const target = scope.steps.find((one) => one.name === step);
    if (!part || !target) throw new Error(`No part asks for ${step}; predict a step of a part.`);
    const kept = keep[step] ?? 0;
    if (kept >= part.marks) throw new Error(`A slip keeps ${kept} of ${part.marks}; keep fewer.`);
    const expr = readExpression(sum, new Set(scope.dimensions.keys()));
    if (!sameDimension(dimensionOf(expr, scope.dimensions), target.unit.dimension)) {
      throw new Error(`The sum for ${step} does not come out in ${target.unit.symbol}; check it.`);
    }
    return { step, expr, keep: kept };
  });
  if (predictions.length === 0) throw new Error('A slip predicts at least one wrong value.');
  return { is, say, credit, makes: predictions };
}

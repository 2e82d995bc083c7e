import { readAuthorFigure } from './author-figure.ts';
import {
  type BarePart,
  type ChoicePart,
  type Given,
  type Part,
  type QuantityPart,
  type SizePart,
  type Step,
  type Tolerance,
} from './compiled.ts';
import { sizesBetween } from './sheet-givens.ts';
import {
  type OptionScope,
  readChoices,
  readMatch,
  readOptions,
  readOrder,
} from './sheet-listed-parts.ts';
import { type Sheet, type SheetAsk } from './sheet-schema.ts';
import { stageOptions } from './stages.ts';
import { STOCK } from './stock-series.ts';
import { parseUnit } from './unit-expression.ts';
import { sameDimension, type Unit } from './units.ts';

/** What a part may lean on. */
interface PartScope extends OptionScope {
  givens: readonly Given[];
  steps: readonly Step[];
  curve: Sheet['curve'];
}

/**
 * Turns one entry of `ask` and its prompt into a checked part.
 *
 * @throws {Error} when it asks for what is not there or cannot be marked.
 */
export function readPart(
  id: string,
  sheet: { ask: SheetAsk; prompt: string },
  scope: PartScope,
): Part {
  const { ask, prompt } = sheet;
  if (prompt === '') throw new Error(`Part ${id} has no text; add a section "## ${id}" below.`);
  if ((ask.carry === 'never') !== (ask.because !== undefined)) {
    throw new Error('carry: never needs the reason under because, and nothing else does.');
  }
  const { marks, carry, because = '', read = null } = ask;
  return { id, prompt, marks, carry, because, read, ...readAsk(ask, scope) };
}

type AnyBarePart = { [K in Part['kind']]: BarePart<Extract<Part, { kind: K }>> }[Part['kind']];

function readAsk(ask: SheetAsk, scope: PartScope): AnyBarePart {
  if ('find' in ask) return readQuantity(ask, scope);
  if ('size' in ask) return readSize(ask, scope);
  if ('choose' in ask) return readChoice(ask, scope);
  if ('stage' in ask) return readStage(ask.stage, scope);
  // What was worked out before is no excuse for a wrong order, pair or reason.
  if (ask.carry === 'own') {
    throw new Error('carry: own fits find, size and choose only; leave it out.');
  }
  if ('order' in ask) return readOrder(ask);
  return 'match' in ask ? readMatch(ask) : readChoices(ask['choose all'], scope);
}

function readQuantity(
  ask: Extract<SheetAsk, { find: string }>,
  scope: PartScope,
): BarePart<QuantityPart> {
  const step = stepNamed(ask.find, scope);
  const units = ask.units.map(parseUnit);
  for (const unit of units) requireKind(unit, step.unit, ask.find);
  if (units.length === 0 && step.unit.symbol !== '') {
    throw new Error(`${ask.find} is in ${step.unit.symbol}; list the units a trainee may use.`);
  }
  const unit = units[0] ?? step.unit;
  return {
    kind: 'quantity',
    step: step.name,
    units,
    tolerance: readTolerance(ask.within, unit),
    rounding: ask.round
      ? { to: inUnit(ask.round.to, unit), way: ask.round.way, text: ask.round.say }
      : null,
  };
}

/** "1 %" is a share of the key, "0.15 h" a width either side of it. */
function readTolerance(within: string, unit: Unit): Tolerance {
  if (within === 'exact') return { kind: 'share', share: 0 };
  const read = readAuthorFigure(within);
  // On a part asked in per cent, "1 %" still means a share of the key.
  if (read.unit.symbol === '%') return { kind: 'share', share: read.figure / 100 };
  if (read.unit.symbol !== '') requireKind(read.unit, unit, 'within');
  const factor = read.unit.symbol === '' ? unit.factor : read.unit.factor;
  return { kind: 'plain', si: read.figure * factor };
}

function inUnit(text: string, unit: Unit): number {
  const read = readAuthorFigure(text);
  return read.unit.symbol === '' ? read.figure : (read.figure * read.unit.factor) / unit.factor;
}

function readSize(ask: Extract<SheetAsk, { size: string }>, scope: PartScope): BarePart<SizePart> {
  const step = stepNamed(ask.size, scope);
  const { unit } = STOCK[ask.stock];
  requireKind(unit, step.unit, ask.size);
  const sizes = sizesBetween(ask.stock, ask.from, ask.to);
  if (sizes.length < 3) throw new Error('Fewer than three sizes give the answer away; widen it.');
  return { kind: 'size', step: step.name, unit, sizes };
}

function readChoice(
  ask: Extract<SheetAsk, { choose: unknown }>,
  scope: PartScope,
): BarePart<ChoicePart> {
  const options = readOptions('choose', ask.choose, scope);
  const plain = options.filter((option) => option.right === true).length;
  const depends = options.some((option) => typeof option.right !== 'boolean');
  if (!depends && plain !== 1) throw new Error(`${plain} options are right; exactly one must be.`);
  return { kind: 'choice', options };
}

function readStage(label: string, scope: PartScope): BarePart<ChoicePart> {
  const { curve } = scope;
  const entry = curve?.intervals[label];
  if (!curve || !entry)
    throw new Error(`No interval ${label} is marked on a curve; add it to the curve.`);
  const right = typeof entry === 'string' ? entry : entry.stage;
  return { kind: 'choice', options: stageOptions(right, curve) };
}

function stepNamed(name: string, scope: PartScope): Step {
  const step = scope.steps.find((one) => one.name === name);
  if (step) return step;
  throw new Error(`No step ${name}; use one of ${scope.steps.map((one) => one.name).join(', ')}.`);
}

function requireKind(unit: Unit, wanted: Unit, what: string): void {
  if (sameDimension(unit.dimension, wanted.dimension)) return;
  throw new Error(
    `${unit.symbol} does not fit ${what}, which is in ${wanted.symbol || 'no unit'}.`,
  );
}

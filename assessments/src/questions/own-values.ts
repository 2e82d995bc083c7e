import { type Compiled, type Drawn, type Option } from './compiled.ts';
import { namesIn } from './expression.ts';
import { leansOn, SolvedOnDemand } from './solve.ts';
import { parseUnit } from './unit-expression.ts';
import { type Dimension, sameDimension, type Unit } from './units.ts';
import { workingsOf } from './workings.ts';

/** A trainee's own answer to a step, and whether it was anything but right. */
interface OwnValue {
  step: string;
  value: number;
  part: string;
  isOff: boolean;
}
/** In the order they were given; of two to one step the later counts. */
export type OwnValues = OwnValue[];

/** What is recomputed on a trainee's own earlier values, as far as it is asked for. */
export interface OwnAccount {
  values: Map<string, number>;
  /** Parts whose answers were used and were not right. */
  parts: string[];
  isOff: boolean;
}

interface Wanted {
  step?: string;
  options?: readonly Option[];
  own: Readonly<OwnValues>;
}

/**
 * Works a step, or the conditions of options, on the trainee's own earlier values.
 * Null when it leans on none of them, or they lead to no finite number.
 */
export function ownFor(question: Compiled, drawn: Drawn, wanted: Wanted): OwnAccount | null {
  const used = usedOwn(question, wanted);
  if (used.length === 0) return null;
  const values = new SolvedOnDemand(question, []);
  for (const name of workingsOf(question).unworked) values.set(name, drawn.values[name] ?? NaN);
  for (const { step, value } of used) values.set(step, value);
  const off = used.filter(({ isOff }) => isOff);
  const account = { parts: off.map(({ part }) => part), isOff: off.length > 0 };
  try {
    if (wanted.step !== undefined) values.get(wanted.step);
    return { values, ...account };
  } catch {
    // Own values may lead outside every table; then there is nothing to carry.
    return null;
  }
}

function usedOwn(question: Compiled, { step, options, own }: Wanted): OwnValue[] {
  if (own.length === 0) return [];
  const latest = new Map(own.map((one) => [one.step, one]));
  const conditions = (options ?? []).flatMap(({ right }) =>
    typeof right === 'boolean' ? [] : [...namesIn(right)],
  );
  // What an own value was made of matters no more: the search stops there.
  const stop = new Set([...latest.keys()].filter((name) => name !== step));
  const needed = leansOn(question, step === undefined ? conditions : [step], stop);
  return [...latest.values()].filter((one) => needed.has(one.step) && one.step !== step);
}

/** The sums on a trainee's own earlier values, worked once and only when they are asked for. */
export class OwnSums {
  private worked: OwnAccount | null | undefined;
  private readonly question: Compiled;
  private readonly drawn: Drawn;
  private readonly wanted: Wanted;
  /** Own values that were there when the part was judged; later ones do not count for it. */
  private readonly count: number;

  constructor(question: Compiled, drawn: Drawn, wanted: Wanted) {
    this.question = question;
    this.drawn = drawn;
    this.wanted = wanted;
    this.count = wanted.own.length;
  }

  get account(): OwnAccount | null {
    if (this.worked === undefined) {
      const own = this.wanted.own.slice(0, this.count);
      this.worked = ownFor(this.question, this.drawn, { ...this.wanted, own });
    }
    return this.worked;
  }
}

/** A value a million times out could not be meant. */
const FURTHEST = 1e6;
/** Currents and voltages run both ways, and so does what is left of them; nothing else here does. */
const RUNS_BOTH_WAYS: readonly Dimension[] = ['A', 'V', ''].map(
  (unit) => parseUnit(unit).dimension,
);

/** Whether a trainee's own value is one nobody could have meant: a cable of minus 4 mm². */
export function isBeyondSense(value: number, key: number, unit: Unit): boolean {
  const ratio = Math.abs(value / key);
  const isFar = key !== 0 && !(ratio >= 1 / FURTHEST && ratio <= FURTHEST);
  if (isFar || !Number.isFinite(value)) return true;
  if (value > 0 || key <= 0) return false;
  return !RUNS_BOTH_WAYS.some((one) => sameDimension(one, unit.dimension));
}

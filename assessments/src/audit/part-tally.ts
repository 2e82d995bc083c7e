import { type Drawn, type DrawnPart, type Given, type Part } from '../questions/compiled.ts';
import { isWithin } from '../questions/tolerance.ts';
import { fromSi, sameDimension, type Unit } from '../questions/units.ts';

/** What many draws showed of one part. */
export interface PartAudit {
  id: string;
  kind: Part['kind'];
  unit: string;
  /** Least and most of the key, in the unit; null where the answer is no figure. */
  range: { least: number; most: number } | null;
  /** From a key to the nearest live slip, in tolerances; null where there is none. */
  nearestSlip: number | null;
  /** Share of draws in which the key is a given that is printed with the question. */
  givenShare: number;
}

/** Counts up what the draws of one part show. */
export class PartTally {
  private readonly part: Part;
  private readonly givens: readonly Given[];
  private least = Infinity;
  private most = -Infinity;
  private nearest = Infinity;
  private asGiven = 0;
  private draws = 0;

  constructor(part: Part, givens: readonly Given[]) {
    this.part = part;
    const unit = unitOf(part);
    this.givens = givens.filter(
      (given) => given.isShown && unit && sameDimension(given.unit.dimension, unit.dimension),
    );
  }

  add(drawn: Drawn): void {
    this.draws += 1;
    const held = drawn.parts[this.part.id];
    const key = keyOf(this.part, held, drawn);
    if (key === null) return;
    this.least = Math.min(this.least, key.si);
    this.most = Math.max(this.most, key.si);
    if (this.givens.some(({ name }) => isWithin(drawn.values[name] ?? NaN, key))) this.asGiven += 1;
    if (held?.kind !== 'quantity' || held.high === held.low) return;
    for (const { value } of held.slips) {
      const away = Math.abs(value - held.key) / ((held.high - held.low) / 2);
      this.nearest = Math.min(this.nearest, away);
    }
  }

  result(): PartAudit {
    const unit = unitOf(this.part);
    const shown = (si: number): number => (unit ? fromSi(si, unit) : si);
    return {
      id: this.part.id,
      kind: this.part.kind,
      unit: unit?.symbol ?? '',
      range: this.least > this.most ? null : { least: shown(this.least), most: shown(this.most) },
      nearestSlip: Number.isFinite(this.nearest) ? this.nearest : null,
      givenShare: this.draws === 0 ? 0 : this.asGiven / this.draws,
    };
  }
}

function unitOf(part: Part): Unit | null {
  if (part.kind === 'size') return part.unit;
  return part.kind === 'quantity' ? (part.units[0] ?? null) : null;
}

interface Key {
  si: number;
  low: number;
  high: number;
}

function keyOf(part: Part, held: DrawnPart | undefined, drawn: Drawn): Key | null {
  if (held?.kind === 'quantity') return { si: held.key, low: held.low, high: held.high };
  if (part.kind !== 'size') return null;
  const si = drawn.values[part.step] ?? NaN;
  return { si, low: si, high: si };
}

import { type BatteryKind } from '../electrical/battery.ts';
import { type Stage } from '../electrical/charging.ts';
import { type Expr } from './expression.ts';
import {
  type CautionView,
  type CompiledQuestion,
  type CurveView,
  type DiagramView,
  type DrawnQuestion,
  type QuestionMeta,
} from './types.ts';
import { type Unit } from './units.ts';

export const FORMAT_VERSION = 1;
export const MARKER_VERSION = 1;

/** Where a given value comes from; figures are in the given's own unit. */
export type Source =
  | { kind: 'value'; figure: number }
  | { kind: 'range'; from: number; to: number; step: number }
  | { kind: 'list'; figures: number[] };

export interface Given {
  name: string;
  symbol: string | null;
  label: string;
  unit: Unit;
  source: Source;
  isShown: boolean;
  /** Significant figures in the table of given values; null prints the figure as short as it is. */
  figures: number | null;
}

/** What is read off a drawn charge curve. Times in `at` are names of givens. */
export type CurveRead =
  | { kind: 'bulk ends' }
  | { kind: 'float starts' }
  | { kind: 'absorption lasts' }
  | { kind: 'amps before float' }
  | { kind: 'amps at'; at: string }
  | { kind: 'volts at'; at: string }
  | { kind: 'battery amps at'; at: string };

export interface Step {
  name: string;
  symbol: string;
  unit: Unit;
  figures: number;
  how: { kind: 'sum'; expr: Expr } | { kind: 'read'; read: CurveRead; because: string };
}

export type Tolerance = { kind: 'share'; share: number } | { kind: 'plain'; si: number };
export type Rounding = { to: number; way: 'up' | 'down' | 'nearest'; text: string } | null;
export type Carry = 'none' | 'own' | 'never';

interface PartBase {
  id: string;
  prompt: string;
  marks: number;
  carry: Carry;
  /** Why nothing is carried; empty unless carry is `never`. */
  because: string;
}
export interface QuantityPart extends PartBase {
  kind: 'quantity';
  step: string;
  /** The first is the unit of the worked answer. Empty for a pure number. */
  units: Unit[];
  tolerance: Tolerance;
  rounding: Rounding;
}
export interface SizePart extends PartBase {
  kind: 'size';
  step: string;
  unit: Unit;
  /** Figures in the unit, smallest first. */
  sizes: number[];
}
export interface Option {
  text: string;
  /** Right always, never, or when a condition holds. */
  right: boolean | Expr;
  /** Why it is wrong. */
  say: string | null;
}
export interface ChoicePart extends PartBase {
  kind: 'choice';
  options: Option[];
}
export type Part = QuantityPart | SizePart | ChoicePart;

export interface Slip {
  /** Sentence for the summary, "You counted the cable out but not back." */
  is: string;
  say: string;
  /** What was right all the same, or null. */
  credit: string | null;
  makes: { step: string; expr: Expr; keep: number }[];
}

export interface CurvePlan {
  battery: { kind: BatteryKind; capacity: string; charge: string; blocks: number };
  charger: {
    limit: string;
    absorption: string;
    float: string;
    tail: string;
    /** h; null for no limit. */
    longestAbsorption: string | null;
  };
  load: { amps: string; from: string | null } | null;
  hours: number;
  /** An interval may be kept before or after the time a given names. */
  intervals: { label: string; stage: Stage; before: string | null; after: string | null }[];
}

/** A question as it is kept: everything checked, nothing left to parse. */
export interface Compiled extends CompiledQuestion {
  meta: QuestionMeta;
  profile: 'metric' | 'awg';
  aids: string[];
  cautions: CautionView[];
  lead: string;
  body: string;
  givens: Given[];
  steps: Step[];
  require: Expr[];
  parts: Part[];
  slips: Slip[];
  diagram: DiagramView | null;
  curve: CurvePlan | null;
}

export interface DrawnOption {
  id: string;
  /** Which option of the part, or which of its sizes. */
  index: number;
}
export type DrawnPart =
  | {
      kind: 'quantity';
      key: number;
      low: number;
      high: number;
      slips: { slip: number; value: number }[];
    }
  | {
      kind: 'options';
      options: DrawnOption[];
      right: string;
      slips: { slip: number; id: string }[];
    };

export interface Drawn extends DrawnQuestion {
  slug: string;
  revision: string;
  /** Every given and step, SI. */
  values: Record<string, number>;
  parts: Record<string, DrawnPart>;
  curve: CurveView | null;
}

/**
 * Opens a stored question.
 *
 * @throws {Error} when it was compiled by another format version.
 */
export function openQuestion(question: CompiledQuestion): Compiled {
  if (question.formatVersion === FORMAT_VERSION) return question as Compiled;
  throw new Error(
    `Question ${question.meta.slug} has format ${question.formatVersion}, this library reads ${FORMAT_VERSION}; publish it again.`,
  );
}

/**
 * Opens a stored draw and sees that it belongs to the question.
 *
 * @throws {Error} when it was drawn from another question, revision or format.
 */
export function openDrawn(question: Compiled, drawn: DrawnQuestion): Drawn {
  const { slug, revision } = drawn as Drawn;
  if (drawn.formatVersion !== FORMAT_VERSION) {
    throw new Error(
      `Draw of ${slug} has format ${drawn.formatVersion}, this library reads ${FORMAT_VERSION}; keep the library that drew it.`,
    );
  }
  if (slug === question.meta.slug && revision === question.meta.revision) return drawn as Drawn;
  throw new Error(
    `Draw of ${slug} revision ${revision} does not belong to ${question.meta.slug} revision ${question.meta.revision}; give the revision it was drawn from.`,
  );
}

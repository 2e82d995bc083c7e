import { type CurvePlan, type CurveRead } from './curve-types.ts';
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
export const MARKER_VERSION = 2;

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

/** An extract of a printed table; figures stand in the unit of their column. */
export interface Table {
  name: string;
  caption: string;
  source: string;
  columns: { name: string; label: string; unit: Unit }[];
  /** An empty cell is null. */
  rows: (number | null)[][];
}

export interface Step {
  name: string;
  symbol: string;
  /** Words for the step, or null. */
  says: string | null;
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
  /** Heading of the lesson paragraph to read after a wrong answer; null takes the question's. */
  read: string | null;
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
/** All that apply; judged on the true values. */
export interface ChoicesPart extends PartBase {
  kind: 'choices';
  options: Option[];
}
/** Items stand in the right order; the numbers below are places in it. */
export interface OrderPart extends PartBase {
  kind: 'order';
  items: string[];
  /** Words for `first` standing before `then` though it belongs after. */
  misplaced: { first: number; then: number; say: string }[];
}
export interface MatchPart extends PartBase {
  kind: 'match';
  /** Each left-hand item with the place of its right-hand text. */
  rows: { text: string; right: number }[];
  options: string[];
  mixed: { row: number; option: number; say: string }[];
}
export type Part = QuantityPart | SizePart | ChoicePart | ChoicesPart | OrderPart | MatchPart;
/** A part without what every part has. */
export type BarePart<P extends Part> = Omit<P, keyof PartBase>;
/** Parts that are asked for by the name of a step. */
export type StepPart = QuantityPart | SizePart;

export interface Slip {
  /** Sentence for the summary, "You counted the cable out but not back." */
  is: string;
  say: string;
  /** What was right all the same, or null. */
  credit: string | null;
  makes: { step: string; expr: Expr; keep: number }[];
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
  tables: Table[];
  steps: Step[];
  require: Expr[];
  parts: Part[];
  slips: Slip[];
  diagram: DiagramView | null;
  curve: CurvePlan | null;
  /** Heading of the lesson paragraph to read, for parts that name none of their own. */
  read: string | null;
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
    }
  /** `right`: ids of all that apply, in no order. */
  | { kind: 'choices'; options: DrawnOption[]; right: string[] }
  /** `right`: ids in the right order. */
  | { kind: 'order'; options: DrawnOption[]; right: string[] }
  /** `right`: the option for each row, in the order of the drawn rows. */
  | { kind: 'match'; rows: DrawnOption[]; options: DrawnOption[]; right: string[] };

export interface Drawn extends DrawnQuestion {
  slug: string;
  revision: string;
  /** Every given and step, SI. */
  values: Record<string, number>;
  parts: Record<string, DrawnPart>;
  curve: CurveView | null;
}

/** What a question stored by an earlier version may lack. */
type Earlier = Omit<Compiled, 'tables' | 'read' | 'steps' | 'parts'> & {
  tables?: Table[];
  read?: string | null;
  steps: (Omit<Step, 'says'> & { says?: string | null })[];
  parts: (Part & { read?: string | null })[];
};

/** Completed once: what is found out about a question is kept by the question itself. */
const completed = new WeakMap<CompiledQuestion, Compiled>();

function complete(stored: Earlier): Compiled {
  return {
    ...stored,
    tables: stored.tables ?? [],
    read: stored.read ?? null,
    steps: stored.steps.map((step) => ({ ...step, says: step.says ?? null })),
    parts: stored.parts.map((part) => ({ ...part, read: part.read ?? null })),
  } as Compiled;
}

/**
 * Opens a stored question; what an earlier version did not keep is filled in.
 *
 * @throws {Error} when it was compiled by another format version.
 */
export function openQuestion(question: CompiledQuestion): Compiled {
  if (question.formatVersion !== FORMAT_VERSION) {
    throw new Error(
      `Question ${question.meta.slug} has format ${question.formatVersion}, this library reads ${FORMAT_VERSION}; publish it again.`,
    );
  }
  if ('tables' in question && 'read' in question) return question as Compiled;
  let whole = completed.get(question);
  if (!whole) completed.set(question, (whole = complete(question as unknown as Earlier)));
  return whole;
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

/** Plain JSON-safe shapes that leave the library. Quantities are SI unless a unit is named. */

/**
 * One typeset piece of a line. A `symbol` reads like `U_d`: italic U, upright subscript d.
 * `differs` marks a term where a trainee's working and the worked answer part ways.
 */
export interface Token {
  kind: 'symbol' | 'number' | 'unit' | 'operator' | 'text';
  text: string;
  differs?: boolean;
}
export type Line = Token[];

export interface GivenView {
  symbol: string | null;
  label: string;
  /** Formatted for display, such as "14.0". */
  value: string;
  unit: string;
}

export interface OptionView {
  /** Opaque: drawn anew for every attempt, says nothing about the option. */
  id: string;
  text: string;
}

export interface PartView {
  id: string;
  kind: 'quantity' | 'choice';
  /** Inline Markdown. */
  prompt: string;
  marks: number;
  symbol: string | null;
  /** Units offered beside the answer line; empty for a pure number. */
  units: string[];
  rounding: string | null;
  options: OptionView[];
  /** `sizes` is one ruled row of stock sizes. */
  layout: 'rows' | 'sizes';
}

export interface CurveView {
  hours: number[];
  volts: number[];
  amps: number[];
  intervals: { label: string; fromH: number; toH: number }[];
}

export interface DiagramView {
  kind: 'two-wire-run';
  labels: {
    source: string;
    fuse: string;
    load: string;
    loadNote: string;
    cable: string;
    length: string;
  };
  load: 'lamp' | 'motor' | 'resistor';
}

export interface CautionView {
  level: 'danger' | 'warning' | 'caution' | 'notice' | 'mandatory';
  title: string;
  text: string;
}

/** What a person may see before marking: no key, tolerance, step, seed or slip. */
export interface QuestionView {
  title: string;
  lead: string;
  body: string;
  subject: string;
  profile: 'metric' | 'awg';
  marks: number;
  aids: string[];
  given: GivenView[];
  diagram: DiagramView | null;
  curve: CurveView | null;
  cautions: CautionView[];
  parts: PartView[];
}

export interface RawAnswer {
  text: string;
  unit: string | null;
  option: string | null;
  working: string;
}
/** By part id. */
export type Answers = Record<string, RawAnswer>;

export type Reading =
  | { state: 'blank' }
  | { state: 'understood'; value: number | null; shown: string }
  | { state: 'ambiguous'; ask: string; readings: string[] }
  | { state: 'not-understood'; ask: string };

export interface QuestionMeta {
  slug: string;
  title: string;
  revision: string;
  subject: string;
  level: 'recall' | 'apply' | 'reason';
  pool: 'practice' | 'paper';
  lesson: string;
  marks: number;
  author: string;
  checkedBy: string;
  sources: string[];
  language: string;
}

/** A checked question. All but `meta` is private to the library; JSON-safe. */
export interface CompiledQuestion {
  formatVersion: number;
  meta: QuestionMeta;
  [key: string]: unknown;
}

/** Values, keys, tolerances and item order of one attempt; JSON-safe. */
export interface DrawnQuestion {
  formatVersion: number;
  markerVersion: number;
  [key: string]: unknown;
}

export type Verdict =
  | 'right'
  | 'carried-forward'
  | 'slip'
  | 'wrong-unit'
  | 'power-of-ten'
  | 'wrong'
  | 'blank'
  | 'not-understood'
  | 'not-carried';

export interface Remark {
  sign: 'gained' | 'lost' | 'note';
  heading: string | null;
  text: string;
}

export interface TraceEntry {
  part: string;
  rule: string;
  detail: string;
}

export interface MarkedPart {
  id: string;
  prompt: string;
  verdict: Verdict;
  marks: number;
  outOf: number;
  yours: Line[];
  worked: Line[];
  remarks: Remark[];
}

export interface MarkedQuestion {
  markerVersion: number;
  marks: number;
  outOf: number;
  /** One sentence, such as "One slip, carried through." */
  summary: string;
  parts: MarkedPart[];
  trace: TraceEntry[];
}

export interface WorkedAnswer {
  title: string;
  lead: string;
  given: GivenView[];
  diagram: DiagramView | null;
  curve: CurveView | null;
  parts: { id: string; prompt: string; lines: Line[] }[];
}

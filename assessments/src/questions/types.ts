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

/** An extract of a printed table; figures formatted for display. */
export interface TableView {
  caption: string;
  source: string;
  columns: { label: string; unit: string }[];
  rows: string[][];
}

export interface OptionView {
  /** Opaque: drawn anew for every attempt, says nothing about the option. */
  id: string;
  text: string;
}

export interface PartView {
  id: string;
  /**
   * `choice` takes one option, `choices` all that apply, `order` the options in the right order,
   * `match` one option for each row.
   */
  kind: 'quantity' | 'choice' | 'choices' | 'order' | 'match';
  /** Inline Markdown. */
  prompt: string;
  marks: number;
  symbol: string | null;
  /** Units offered beside the answer line; empty for a pure number. */
  units: string[];
  rounding: string | null;
  options: OptionView[];
  /** Left-hand items of a `match`; their ids are as opaque as an option's. */
  rows: OptionView[];
  /** `sizes` is one ruled row of stock sizes. */
  layout: 'rows' | 'sizes';
}

export interface CurveView {
  hours: number[];
  /** At the charger's posts; the battery's too where no lead is modelled between them. */
  volts: number[];
  /** Out of the charger. */
  amps: number[];
  /** At the battery's posts, where they are shown apart. */
  batteryVolts?: number[];
  /** At the charger's input, where it is shown. */
  inputVolts?: number[];
  /** Into the battery, where they are shown apart; under 0 out of it. */
  batteryAmps?: number[];
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
  tables: TableView[];
  diagram: DiagramView | null;
  curve: CurveView | null;
  cautions: CautionView[];
  parts: PartView[];
}

export interface RawAnswer {
  text: string;
  unit: string | null;
  option: string | null;
  /**
   * `choices`: ids chosen, in any order. `order`: every id, in the trainee's order. `match`: the id
   * chosen for each row, in the order of the view's rows, '' where none is. Missing: none of these.
   */
  options?: string[];
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
  /** Some of what was chosen, put in order or matched is right. */
  | 'partly-right'
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
  /** The step that went wrong, with the words for it ('' when it has none); null where none did. */
  wrongStep: { symbol: string; says: string } | null;
  /** Heading of the lesson paragraph to read after a wrong answer. */
  read: string | null;
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

/** What a marking decided, without the lines and words that explain it. */
export interface JudgedQuestion {
  markerVersion: number;
  marks: number;
  outOf: number;
  parts: { id: string; verdict: Verdict; marks: number; outOf: number; rule: string }[];
}

export interface WorkedAnswer {
  title: string;
  lead: string;
  given: GivenView[];
  tables: TableView[];
  diagram: DiagramView | null;
  curve: CurveView | null;
  parts: { id: string; prompt: string; lines: Line[] }[];
}

/** A question with all but the last steps worked, to be answered from there. */
export interface FadedQuestion {
  /** How many of the last steps are left to the trainee; 0 is fully worked. */
  left: number;
  /** Parts of which something is worked: whole, or the steps on the way to their answer. */
  shown: { part: string; lines: Line[] }[];
  /** Parts left to answer. */
  asked: string[];
}

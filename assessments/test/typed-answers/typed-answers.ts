/** The value in SI and what is shown back; two readings to choose from; not understood; nothing. */
export type TypedAnswer =
  | [typed: string, si: number, shown: string]
  | [typed: string, readings: string[]]
  | [typed: string, state: 'no' | 'blank'];

/** What people type where a quantity is asked for, and what each must mean. */
export interface TypedAnswers {
  asked: string;
  /** Units offered beside the line; the first is the one that is chosen. */
  units: string[];
  answers: TypedAnswer[];
}

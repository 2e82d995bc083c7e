import { type Blueprint } from './papers/types.ts';
import {
  type Answers,
  type CompiledQuestion,
  type DrawnQuestion,
  type MarkedQuestion,
  type PartView,
  type QuestionView,
  type RawAnswer,
  type Reading,
  type WorkedAnswer,
} from './questions/types.ts';

export type * from './questions/types.ts';
export type * from './papers/types.ts';
export { SheetInvalid } from './questions/errors.ts';
export { PoolTooSmall } from './papers/errors.ts';
export { SUBJECTS } from './subjects.ts';

const unbuilt = (): never => {
  throw new Error('not built');
};

export function readAnswer(_part: PartView, _answer: RawAnswer): Reading {
  return unbuilt();
}
export function parseQuestion(_source: string, _path: string): CompiledQuestion {
  return unbuilt();
}
export function drawQuestion(_question: CompiledQuestion, _seed: string): DrawnQuestion {
  return unbuilt();
}
export function presentQuestion(_question: CompiledQuestion, _drawn: DrawnQuestion): QuestionView {
  return unbuilt();
}
export function markQuestion(
  _question: CompiledQuestion,
  _drawn: DrawnQuestion,
  _answers: Answers,
): MarkedQuestion {
  return unbuilt();
}
export function workQuestion(_question: CompiledQuestion, _drawn: DrawnQuestion): WorkedAnswer {
  return unbuilt();
}
export function parseBlueprint(_source: string, _path: string): Blueprint {
  return unbuilt();
}
export function assemblePaper(
  _blueprint: Blueprint,
  _pool: { slug: string; subject: string }[],
  _seed: string,
): string[] {
  return unbuilt();
}

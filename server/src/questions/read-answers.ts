import { readAnswer } from '@ferrule/assessments';
import { InvalidRequest } from '../problems/common.errors.ts';
import type { UnclearPart } from './answers.errors.ts';
import type { Answers, QuestionView, Reading } from './question-view.ts';

const BLANK = { text: '', unit: null, option: null, working: '' };

/** @throws {InvalidRequest} when an answer names a part the question does not have. */
export function requireKnownParts(question: QuestionView, answers: Answers): void {
  const known = new Set(question.parts.map(({ id }) => id));
  const strange = Object.keys(answers).filter((part) => !known.has(part));
  if (strange.length === 0) return;
  throw new InvalidRequest(
    strange.map((part) => ({ pointer: `#/answers/${part}`, detail: noSuchPart(part, [...known]) })),
  );
}

/** @throws {InvalidRequest} when the question has no such part. */
export function requireKnownPart({ parts }: QuestionView, part: string): void {
  const known = parts.map(({ id }) => id);
  if (known.includes(part)) return;
  throw new InvalidRequest([{ pointer: '#/part', detail: noSuchPart(part, known) }]);
}

const noSuchPart = (part: string, asked: readonly string[]) =>
  asked.length === 0
    ? `Part ${part} is not asked: the question is worked in full.`
    : `There is no part ${part} to answer; the parts are ${asked.join(', ')}.`;

/** How each part's answer is understood. It is compared with nothing. */
export function readAnswers(question: QuestionView, answers: Answers): Record<string, Reading> {
  return Object.fromEntries(
    question.parts.map((part) => [part.id, readAnswer(part, answers[part.id] ?? BLANK)]),
  );
}

/** Parts to be asked back; a part left blank is not one of them. */
export function unclearParts(question: QuestionView, answers: Answers): UnclearPart[] {
  return Object.entries(readAnswers(question, answers)).flatMap(([part, reading]) => {
    if (reading.state === 'ambiguous') {
      return [{ part, ask: reading.ask, readings: reading.readings }];
    }
    return reading.state === 'not-understood' ? [{ part, ask: reading.ask, readings: [] }] : [];
  });
}

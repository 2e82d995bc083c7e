import { answerOf, api } from '../../api/client.ts';
import { type Answer } from '../../api/views.ts';
import { readUnclear } from '../../ui/question/unclear.ts';
import { type Answers } from '../../ui/question/views.ts';

export type PracticeView = Answer<'Practice_start'>;

export function startPractice(question: string) {
  return answerOf(api.POST('/api/practice', { body: { question } }));
}

export function answerPractice(id: string, answers: Answers) {
  return answerOf(
    api.POST('/api/practice/{id}/answers', { params: { path: { id } }, body: { answers } }),
  );
}

export function askHint(id: string, part: string) {
  return answerOf(
    api.POST('/api/practice/{id}/hints', { params: { path: { id } }, body: { part } }),
  );
}

/** What is asked back, by part; null when the refusal is another one. */
export function unclearParts(error: unknown): Record<string, string> | null {
  const unclear = readUnclear(error);
  return unclear && Object.fromEntries(unclear.map(({ part, ask }) => [part, ask]));
}

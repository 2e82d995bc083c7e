import { answerOf, api } from '../../api/client.ts';
import { isProblem } from '../../api/problem.ts';
import { type Answer } from '../../api/views.ts';
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

interface Unclear {
  part: string;
  ask: string;
}

function isUnclear(item: unknown): item is Unclear {
  return typeof item === 'object' && item !== null && 'part' in item && 'ask' in item;
}

/** What is asked back, by part; null when the refusal is another one. */
export function unclearParts(error: unknown): Record<string, string> | null {
  if (!isProblem(error, 'answer-unclear')) return null;
  const { unclear } = error.problem;
  const parts = Array.isArray(unclear) ? unclear.filter(isUnclear) : [];
  return Object.fromEntries(parts.map(({ part, ask }) => [part, ask]));
}

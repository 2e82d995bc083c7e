import { useMutation } from '@tanstack/react-query';
import { useEffect, useRef, useState } from 'react';
import { answerOf, api } from '../../api/client.ts';
import { type Answer } from '../../api/views.ts';
import { readUnclear } from './unclear.ts';
import { type Answers, type RawAnswer } from './views.ts';

export type PracticeView = Answer<'Practice_start'>;

/** Draws fresh figures; only the last steps are left to do where a number of them is given. */
export function startPractice(question: string, left?: number) {
  const body = { question, ...(left !== undefined && { left }) };
  return answerOf(api.POST('/api/practice', { body }));
}

function answerPractice(id: string, answers: Answers) {
  return answerOf(
    api.POST('/api/practice/{id}/answers', { params: { path: { id } }, body: { answers } }),
  );
}

export function askHint(id: string, part: string) {
  return answerOf(
    api.POST('/api/practice/{id}/hints', { params: { path: { id } }, body: { part } }),
  );
}

/** One practice question from its drawing to its mark; what is typed lives on the page alone. */
export function usePracticeAnswers(id: string, onMarked?: () => void) {
  const [answers, setAnswers] = useState<Answers>({});
  const mark = useMutation({
    mutationFn: () => answerPractice(id, answers),
    onSuccess: onMarked,
  });
  const unclear = readUnclear(mark.error);
  return {
    answers,
    change: (part: string, answer: RawAnswer) =>
      setAnswers((kept) => ({ ...kept, [part]: answer })),
    mark,
    /** What is asked back, by part; null when nothing is. */
    unclear: unclear && Object.fromEntries(unclear.map(({ part, ask }) => [part, ask])),
  };
}

/** The button that was pressed is gone, so the focus goes to the heading of what took its place. */
export function useFocusOnTurn(isMarked: boolean) {
  const heading = useRef<HTMLHeadingElement>(null);
  useEffect(() => heading.current?.focus(), [isMarked]);
  return heading;
}

export const sayHints = (hints: readonly string[]) =>
  hints.length === 0 ? '' : hints.length === 1 ? ', with a hint' : ', with hints';

import { Button } from '@radix-ui/themes';
import { useMutation } from '@tanstack/react-query';
import { lazy, Suspense, use } from 'react';
import { ProblemCallout } from '../../ui/problem-callout.tsx';
import { startPractice } from '../../ui/question/practice.ts';
import { RuledLines } from '../../ui/states.tsx';
import { LessonContext } from './lesson-context.ts';

// Much code that a reader who only reads never needs.
const TryAttempt = lazy(() =>
  import('./try-attempt.tsx').then((part) => ({ default: part.TryAttempt })),
);

/** One practice question in the middle of the sheet, marked where it stands. */
export function TryQuestion({ question }: { question: string }) {
  const start = useMutation({ mutationFn: () => startPractice(question) });
  const { tries } = use(LessonContext);
  // Two on one sheet need two names.
  const name = tries.length > 1 ? `Try it, ${tries.indexOf(question) + 1}` : 'Try it';
  return (
    <section className="try-question" aria-label={name}>
      {start.data ? (
        <Suspense fallback={<RuledLines what="the question" />}>
          <TryAttempt
            key={start.data.id}
            practice={start.data}
            isRenewing={start.isPending}
            onAgain={() => start.mutate()}
          />
        </Suspense>
      ) : (
        <div className="try-invitation">
          <div>
            <h2>Try it</h2>
            <p>One question with figures of its own, marked here. It counts for nothing.</p>
          </div>
          <Button variant="outline" disabled={start.isPending} onClick={() => start.mutate()}>
            {start.isPending ? 'Drawing figures' : 'Draw my figures'}
          </Button>
        </div>
      )}
      <ProblemCallout error={start.error} />
    </section>
  );
}

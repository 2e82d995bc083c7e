import { Button } from '@radix-ui/themes';
import { useMutation, useQueryClient } from '@tanstack/react-query';
import { type RefObject, useEffect, useRef, useState } from 'react';
import { ProblemCallout } from '../../ui/problem-callout.tsx';
import { CurveReader } from '../../ui/question/curve-reader.tsx';
import { QuestionCard } from '../../ui/question/question-card.tsx';
import { readUnclear } from '../../ui/question/unclear.ts';
import { isAnswered, isHalfMatched } from '../../ui/question/views.ts';
import { type Kept } from './answer-keeper.ts';
import { EarlierSheets } from './earlier-sheets.tsx';
import { ItemHead } from './item-head.tsx';
import { attemptQuery, handIn, type WorksheetView } from './queries.ts';
import { SavedWords } from './saved-words.tsx';
import { useAnswerKeeper } from './use-answer-keeper.ts';

/** By item, then by part. */
type Asks = Record<string, Record<string, string>>;

/** A worksheet before it is handed in. */
export function AnswerSheet({ attempt }: { attempt: WorksheetView }) {
  const { keeper, kept } = useAnswerKeeper(attempt);
  const [typing, setTyping] = useState<string | null>(null);
  const handingIn = useHandIn(attempt.id, () => keeper.flush());
  const asked = asksOf(handingIn.error);
  const sheet = useRef<HTMLDivElement>(null);
  useFocusOnAsked(sheet, handingIn.error);

  const asks = readAsks(kept, typing);
  return (
    <div ref={sheet}>
      {attempt.items.map((item, index) => (
        <section key={item.key} aria-labelledby={`${item.key}-title`}>
          <ItemHead item={item} place={[index + 1, attempt.items.length]} />
          <QuestionCard
            question={item.question}
            answers={kept.answers[item.key] ?? {}}
            unclear={{ ...asks[item.key], ...asked?.[item.key] }}
            curve={item.question.curve && <CurveReader curve={item.question.curve} />}
            onChange={(part, answer) => {
              setTyping(`${item.key} ${part}`);
              if (asked) handingIn.reset();
              keeper.change(item.key, part, answer);
            }}
            onLeave={() => {
              setTyping(null);
              void keeper.flush();
            }}
          />
        </section>
      ))}
      <EarlierSheets attempt={attempt} />
      {!asked && <ProblemCallout error={handingIn.error} />}
      <ProblemCallout error={kept.error} />
      <HandInStrip attempt={attempt} kept={kept} handingIn={handingIn} isAskedBack={!!asked} />
    </div>
  );
}

function useHandIn(id: string, flush: () => Promise<boolean>) {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: async () => {
      await flush();
      return handIn(id);
    },
    onSuccess: (marked) => {
      queryClient.setQueryData(attemptQuery(id).queryKey, marked);
      void queryClient.invalidateQueries({ queryKey: ['worksheet', marked.number] });
      for (const key of ['course', 'record', 'practice']) {
        void queryClient.invalidateQueries({ queryKey: [key] });
      }
    },
  });
}

/** What was asked back when handing in; null when handing in was not refused for that. */
function asksOf(error: unknown): Asks | null {
  const unclear = readUnclear(error);
  if (!unclear) return null;
  const asks: Asks = {};
  for (const { key = '', part, ask } of unclear) asks[key] = { ...asks[key], [part]: ask };
  return asks;
}

/** What the last save could not read, except where somebody is still typing. */
function readAsks({ readings }: Kept, typing: string | null): Asks {
  const asks: Asks = {};
  for (const [key, ofItem] of Object.entries(readings)) {
    for (const [part, reading] of Object.entries(ofItem)) {
      if ('ask' in reading && typing !== `${key} ${part}`) {
        asks[key] = { ...asks[key], [part]: reading.ask };
      }
    }
  }
  return asks;
}

function useFocusOnAsked(sheet: RefObject<HTMLElement | null>, error: unknown) {
  useEffect(() => {
    if (error) sheet.current?.querySelector<HTMLElement>('[aria-invalid="true"]')?.focus();
  }, [sheet, error]);
}

interface HandInStripProps {
  attempt: WorksheetView;
  kept: Kept;
  handingIn: { isPending: boolean; mutate: () => void };
  isAskedBack: boolean;
}

/** How much is answered, what is saved, and handing in. Blank parts are asked about once. */
function HandInStrip({ attempt, kept, handingIn, isAskedBack }: HandInStripProps) {
  const [isAsking, setAsking] = useState(false);
  const parts = attempt.items.flatMap(({ key, question }) =>
    question.parts.map((part) => isAnswered(part, kept.answers[key]?.[part.id])),
  );
  const blank = parts.filter((answered) => !answered).length;
  const hasHalf = attempt.items.some(({ key, question }) =>
    question.parts.some((part) => isHalfMatched(part, kept.answers[key]?.[part.id])),
  );
  const press = () => {
    if (blank > 0 && !isAsking) return setAsking(true);
    setAsking(false);
    handingIn.mutate();
  };
  return (
    <div className="action-strip hand-in">
      <p role="status">
        {isAskedBack && <b>Some answers cannot be read. Nothing has been marked. </b>}
        {isAsking && blank > 0 ? (
          <>
            <b>{sayBlank(blank, hasHalf)}</b> What is missing gets no marks. Hand in all the same?
          </>
        ) : (
          <>
            <b>
              {parts.length - blank} of {parts.length} parts answered.
            </b>{' '}
            <SavedWords kept={kept} />
          </>
        )}
      </p>
      <span className="buttons">
        {isAsking && blank > 0 && (
          <Button size="3" variant="outline" onClick={() => setAsking(false)}>
            Go on working
          </Button>
        )}
        <Button size="3" disabled={handingIn.isPending} onClick={press}>
          {handingIn.isPending ? 'Handing in' : 'Hand in for marking'}
        </Button>
      </span>
    </div>
  );
}

function sayBlank(blank: number, hasHalf: boolean): string {
  const what = hasHalf ? 'blank or not all matched' : 'blank';
  return blank === 1 ? `One part is ${what}.` : `${blank} parts are ${what}.`;
}

import { Button } from '@radix-ui/themes';
import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { Link, useNavigate } from 'react-router-dom';
import { ProblemCallout } from '../../ui/problem-callout.tsx';
import { handIn, sittingQuery } from './queries.ts';
import { sayComeBack, sayStandings } from './review-words.ts';
import { type SittingDesk } from './sitting-desk.ts';

/** The last step: asked once more in words, then the paper is closed. */
export function HandIn({ shared }: { shared: SittingDesk }) {
  const { sitting, standings, pennants, state, isOver } = shared;
  const [isAsked, setIsAsked] = useState(false);
  const navigate = useNavigate();
  const cache = useQueryClient();
  const handingIn = useMutation({
    mutationFn: () => handIn(sitting.id),
    onSuccess: async () => {
      await navigate(`/sittings/${sitting.id}/result`);
      cache.removeQueries({ queryKey: sittingQuery(sitting.id).queryKey });
    },
  });
  const firstLeft = sitting.items.find((_, index) => standings[index] !== 'answered');
  const backTo = firstLeft?.number ?? 1;
  return (
    <>
      {handingIn.error && (
        <div className="section">
          <ProblemCallout error={handingIn.error} />
        </div>
      )}
      <div className="action-strip">
        <p aria-live="polite">
          {isAsked ? (
            <>
              <b>Hand in now?</b> {sayStandings(standings)} The paper closes and cannot be opened
              again.
            </>
          ) : (
            <b>{sayComeBack(sitting.items, pennants)}</b>
          )}
        </p>
        <div className="buttons">
          {isAsked ? (
            <Button size="3" variant="outline" onClick={() => setIsAsked(false)}>
              Not yet
            </Button>
          ) : (
            <Button size="3" variant="outline" asChild>
              <Link to={`/sittings/${sitting.id}?q=${backTo}`}>Back to question {backTo}</Link>
            </Button>
          )}
          <Button
            size="3"
            disabled={handingIn.isPending || state.waiting > 0 || state.stopped !== null || isOver}
            onClick={() => (isAsked ? handingIn.mutate() : setIsAsked(true))}
          >
            {sayButton(sitting.paper.number, {
              isAsked,
              isPending: handingIn.isPending,
              isWaiting: state.waiting > 0,
            })}
          </Button>
        </div>
      </div>
    </>
  );
}

interface ButtonState {
  isAsked: boolean;
  isPending: boolean;
  isWaiting: boolean;
}

function sayButton(paper: string, { isAsked, isPending, isWaiting }: ButtonState): string {
  if (isPending) return 'Handing in';
  if (isWaiting) return 'Waits until all answers are sent';
  return isAsked ? 'Yes, hand in' : `Hand in paper ${paper}`;
}

import { Button } from '@radix-ui/themes';
import { useMutation, useQueryClient } from '@tanstack/react-query';
import { type ReactNode, useRef } from 'react';
import { ProblemCallout } from '../../ui/problem-callout.tsx';
import { Ferrule } from '../../ui/symbols/ferrule.tsx';
import {
  type LessonView,
  markDone,
  type ProgressView,
  progressQuery,
  undoDone,
} from './queries.ts';

interface SeatStripProps {
  lesson: LessonView;
  progress: ProgressView;
  /** The worksheet of the unit and the neighbours; once done, they hold the solid button. */
  next: (isDone: boolean) => ReactNode;
}

/** At the end of the sheet: marking it done seats its ferrule. */
export function SeatStrip({ lesson, progress, next }: SeatStripProps) {
  const said = useRef<HTMLParagraphElement>(null);
  const change = useProgressChange(lesson, () => said.current?.focus());
  const isRevised = progress.revisionRead !== null && progress.revisionRead !== progress.current;
  const isDone = progress.state === 'done' && !isRevised;
  return (
    <div className={isDone ? 'seat-strip seated' : 'seat-strip'}>
      <SeatDrawing />
      <div>
        <p role="status" ref={said} tabIndex={-1}>
          {isDone ? (
            <>
              <b>Done.</b> The ferrule of sheet {lesson.number} is seated on the course map.
            </>
          ) : (
            <>
              <b>Read to the end?</b> Mark the sheet done and its ferrule seats on the course map.
            </>
          )}
        </p>
        <ProblemCallout error={change.error} />
        <div className="actions">
          {!isDone && (
            <Button size="3" disabled={change.isPending} onClick={() => change.mutate('done')}>
              Mark sheet done
            </Button>
          )}
          {next(isDone)}
          {isDone && (
            <button
              type="button"
              className="text-button"
              disabled={change.isPending}
              onClick={() => change.mutate('undo')}
            >
              Not done after all
            </button>
          )}
        </div>
      </div>
    </div>
  );
}

/** The pressed button gives way to another: the focus goes to what is said instead. */
function useProgressChange({ number, revision }: LessonView, onChanged: () => void) {
  const queryClient = useQueryClient();
  return useMutation({
    mutationFn: (to: 'done' | 'undo') =>
      to === 'done' ? markDone(number, revision) : undoDone(number),
    onSuccess: (kept) => {
      queryClient.setQueryData(progressQuery(number).queryKey, kept);
      void queryClient.invalidateQueries({ queryKey: ['course'] });
      onChanged();
    },
  });
}

/** The terminal and its ferrule: offered up, then seated with the conductor live below. */
function SeatDrawing() {
  return (
    <svg className="seat-drawing" viewBox="0 0 150 44" width="150" height="44" aria-hidden="true">
      <path className="seat-conductor above" d="M22 0V22" />
      <path className="seat-conductor below" d="M22 22V44" />
      <circle className="terminal-ring" cx="22" cy="22" r="11" />
      <g className="seat-ferrule">
        <Ferrule x={40} y={22} scale={1.5} />
        <path className="terminal-tail" d="M104 22H150" />
      </g>
    </svg>
  );
}

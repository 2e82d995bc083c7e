import { useState } from 'react';
import { sayTimeOfDay } from '../../ui/dates.ts';
import { TickSign } from '../../ui/symbols/signs.tsx';
import { type DeskState } from './answer-desk.ts';
import { sayClock, useSecondsLeft, warningAt } from './time-left.ts';

interface PaperBarProps {
  state: DeskState;
  answered: string;
  closesAt: string;
  minutes: number;
}

const alwaysShownBelowSeconds = 300;

/** Saved state and the clock, which may be hidden until five minutes are left. */
export function PaperBar({ state, answered, closesAt, minutes }: PaperBarProps) {
  const [isHidden, setHidden] = useState(false);
  const secondsLeft = useSecondsLeft(closesAt, state.clockOffsetMs);
  const isShort = secondsLeft <= alwaysShownBelowSeconds;
  return (
    <div className="paper-bar">
      <p>
        <SavedSaid state={state} /> <span className="muted">{answered}</span>
      </p>
      <p className="paper-clock">
        {isHidden && !isShort ? (
          <span className="muted">Clock hidden</span>
        ) : (
          <>
            <span className="muted">Time left</span>
            <b role="timer" aria-live="off" className={isShort ? 'short' : undefined}>
              {sayClock(secondsLeft)}
            </b>
          </>
        )}
        {!isShort && (
          <button type="button" className="text-button" onClick={() => setHidden(!isHidden)}>
            {isHidden ? 'Show clock' : 'Hide clock'}
          </button>
        )}
      </p>
      <p className="visually-hidden" role="status">
        {warningAt(secondsLeft, minutes * 60)}
      </p>
    </div>
  );
}

function SavedSaid({ state }: { state: DeskState }) {
  if (state.waiting > 0) {
    const [count, wait] = [state.waiting, state.waiting === 1 ? 'answer waits' : 'answers wait'];
    return (
      <b className="pen">
        {count} {wait} on this device
      </b>
    );
  }
  if (!state.savedAt) return <b>Nothing written yet</b>;
  return (
    <>
      <TickSign /> <b role="status">Saved {sayTimeOfDay(state.savedAt)}</b>
    </>
  );
}

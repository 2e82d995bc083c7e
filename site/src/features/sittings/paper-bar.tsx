import { useState } from 'react';
import { type Standing } from '../../ui/question/views.ts';
import { sayTimeOfDay } from '../../ui/dates.ts';
import { OpenRingSign, TickSign } from '../../ui/symbols/signs.tsx';
import { type DeskState } from './answer-desk.ts';
import { type SittingDesk } from './sitting-desk.ts';
import { isShortOfTime, sayClock, useSecondsLeft, warningAt } from './time-left.ts';

type PaperBarProps = Pick<SittingDesk, 'sitting' | 'state' | 'standings'>;

/** Hiding the clock is kept for the sitting only, from one of its pages to the next. */
const hiddenName = (sittingId: string) => `ferrule.clock-hidden.${sittingId}`;

/** Saved state and the clock, which may be hidden until five minutes are left. */
export function PaperBar({ sitting, state, standings }: PaperBarProps) {
  const secondsLeft = useSecondsLeft(sitting.closesAt, state.clockOffsetMs);
  return (
    <div className="paper-bar">
      <p className="paper-saved">
        <SavedSaid state={state} /> <span className="muted">{sayAnswered(standings)}</span>
      </p>
      <Clock sittingId={sitting.id} secondsLeft={secondsLeft} />
      <p className="visually-hidden" role="status">
        {warningAt(secondsLeft, sitting.minutes * 60)}
      </p>
    </div>
  );
}

function Clock({ sittingId, secondsLeft }: { sittingId: string; secondsLeft: number }) {
  const [isHidden, setHidden] = useState(() => wasHidden(sittingId));
  const isShort = isShortOfTime(secondsLeft);
  const toggle = () => {
    setHidden(!isHidden);
    keepHidden(sittingId, !isHidden);
  };
  return (
    <p className="paper-clock">
      {isHidden && !isShort ? (
        <span className="muted">
          Clock hidden. <span className="only-wide-inline">It shows at five minutes.</span>
        </span>
      ) : (
        <>
          <span className="muted">Time left</span>
          <b role="timer" aria-live="off" className={isShort ? 'short' : undefined}>
            {sayClock(secondsLeft)}
          </b>
        </>
      )}
      {!isShort && (
        <button type="button" className="text-button" onClick={toggle}>
          {isHidden ? 'Show clock' : 'Hide clock'}
        </button>
      )}
    </p>
  );
}

function SavedSaid({ state }: { state: DeskState }) {
  const isCut = state.cut !== null && state.waiting > 0;
  const saved = state.savedAt ? `Saved ${sayTimeOfDay(state.savedAt)}` : '';
  return (
    <>
      {isCut ? <OpenRingSign className="pen" /> : saved !== '' && <TickSign className="passed" />}{' '}
      {isCut && (
        <b className="pen">
          {state.waiting} {state.waiting === 1 ? 'answer waits' : 'answers wait'} on this device
        </b>
      )}
      {!isCut && saved === '' && <b>Nothing written yet</b>}
      <b role="status">{isCut ? '' : saved}</b>
    </>
  );
}

/** "7 of 12 answered, 1 part answered" */
function sayAnswered(standings: Standing[]): string {
  const count = (standing: Standing) => standings.filter((one) => one === standing).length;
  const answered = `${count('answered')} of ${standings.length} answered`;
  return count('part') > 0 ? `${answered}, ${count('part')} part answered` : answered;
}

function wasHidden(sittingId: string): boolean {
  try {
    return sessionStorage.getItem(hiddenName(sittingId)) !== null;
  } catch {
    return false;
  }
}

function keepHidden(sittingId: string, isHidden: boolean): void {
  try {
    if (isHidden) sessionStorage.setItem(hiddenName(sittingId), 'hidden');
    else sessionStorage.removeItem(hiddenName(sittingId));
  } catch {
    // Without storage it is hidden on this page only.
  }
}

import { Button } from '@radix-ui/themes';
import { sayTimeOfDay } from '../../ui/dates.ts';
import { Strip, useSignal } from '../../ui/strip.tsx';
import { type SittingDesk } from './sitting-desk.ts';
import { isShortOfTime, useSecondsLeft } from './time-left.ts';

type DeskStripsProps = Pick<
  SittingDesk,
  'sitting' | 'state' | 'isOver' | 'takeOver' | 'isTakingOver'
>;

/** What the signal, the clock or another device means for this paper; the weightiest of them. */
export function DeskStrips({ sitting, state, isOver, ...taking }: DeskStripsProps) {
  const hasSignal = useSignal();
  const secondsLeft = useSecondsLeft(sitting.closesAt, state.clockOffsetMs);
  const closes = sayTimeOfDay(sitting.closesAt);
  if (isOver) return <TimeIsOver />;
  if (state.stopped === 'taken-over') return <TakenOver {...taking} />;
  return (
    <>
      {!hasSignal || state.cut ? (
        <Cut
          waiting={state.waiting}
          closes={closes}
          isServer={hasSignal && state.cut === 'server'}
        />
      ) : (
        state.caughtUp > 0 &&
        state.waiting === 0 && (
          <Strip kind="back" across>
            <p>
              <b>Signal back.</b> Everything you wrote has been sent and has its receipt.
            </p>
          </Strip>
        )
      )}
      {isShortOfTime(secondsLeft) && (
        // Seen, not announced: the spoken warnings are at half time, ten minutes and one minute.
        <div className="strip short-of-time across">
          <p>
            <b>Less than five minutes left.</b> At {closes} the paper is handed in as it stands.
          </p>
        </div>
      )}
    </>
  );
}

function TimeIsOver() {
  return (
    <Strip kind="said" across>
      <p>
        <b>The time is over.</b> The paper is handed in with every answer that has its receipt. The
        result opens here as soon as the school’s server answers.
      </p>
    </Strip>
  );
}

function TakenOver({ takeOver, isTakingOver }: Pick<SittingDesk, 'takeOver' | 'isTakingOver'>) {
  return (
    <Strip kind="said" across>
      <div className="take-over">
        <p>
          <b>This paper is being written somewhere else.</b> Here it can only be read. If you take
          over, the other place can only read it.
        </p>
        <Button size="3" variant="outline" disabled={isTakingOver} onClick={takeOver}>
          {isTakingOver ? 'Taking over' : 'Take over here'}
        </Button>
      </div>
    </Strip>
  );
}

interface CutProps {
  waiting: number;
  closes: string;
  isServer: boolean;
}

function Cut({ waiting, closes, isServer }: CutProps) {
  return (
    <Strip kind="lost" across>
      <p>
        <b>{isServer ? 'The school’s server does not take answers just now.' : 'No signal.'}</b>{' '}
        Carry on.{' '}
        {waiting > 0 &&
          (waiting === 1
            ? 'One answer waits on this device. '
            : `${waiting} answers wait on this device. `)}
        What you write is kept here and sent in order. What reaches the school before {closes}{' '}
        counts. Do not clear the browser.
      </p>
    </Strip>
  );
}

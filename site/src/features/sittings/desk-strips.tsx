import { Button } from '@radix-ui/themes';
import { sayTimeOfDay } from '../../ui/dates.ts';
import { Strip } from '../../ui/strip.tsx';
import { type DeskState } from './answer-desk.ts';

interface DeskStripsProps {
  state: DeskState;
  closesAt: string;
  onTakeOver: () => void;
}

/** What the signal or another device means for this paper. */
export function DeskStrips({ state, closesAt, onTakeOver }: DeskStripsProps) {
  if (state.stopped === 'taken-over') {
    return (
      <Strip kind="said" across>
        <p>
          This paper is being written on another device. Here it can only be read.{' '}
          <Button variant="outline" onClick={onTakeOver}>
            Take over here
          </Button>
        </p>
      </Strip>
    );
  }
  if (!state.isCut) return null;
  return (
    <Strip kind="lost" across>
      <p>
        <b>No signal.</b> Go on writing:{' '}
        {state.waiting === 1 ? 'one answer waits' : `${state.waiting} answers wait`} on this device
        and {state.waiting === 1 ? 'is' : 'are'} sent when the signal is back. What reaches the
        school before {sayTimeOfDay(closesAt)} counts.
      </p>
    </Strip>
  );
}

import { Strip } from '../../ui/strip.tsx';
import { RevisedSign } from '../../ui/symbols/signs.tsx';
import { type ProgressView } from './queries.ts';

/** For somebody who finished an earlier revision. The ferrule stays seated. */
export function RevisionNotice({ progress }: { progress: ProgressView }) {
  const { revisionRead, current } = progress;
  if (revisionRead === null || revisionRead === current) return null;
  return (
    <Strip kind="said" across>
      <RevisedSign letter={current} />
      <b>Revision {current} is out.</b> You marked revision {revisionRead} done. Read the sheet
      again, then mark this one done.
    </Strip>
  );
}

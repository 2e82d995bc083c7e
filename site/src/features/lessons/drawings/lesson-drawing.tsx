import { use } from 'react';
import { LessonContext } from '../lesson-context.ts';
import { ChargeCurve } from './charge-curve.tsx';
import { CurrentBalance } from './current-balance.tsx';
import { SourceTimeline } from './source-timeline.tsx';
import { VoltageRun } from './voltage-run.tsx';

interface LessonDrawingProps {
  kind: string;
  title: string;
}

/** The drawing to handle that the text names by its kind. */
export function LessonDrawing({ kind, title }: LessonDrawingProps) {
  const { drawings } = use(LessonContext);
  const run = drawings['voltage-run'];
  const curve = drawings['charge-curve'];
  const timeline = drawings['source-timeline'];
  const balance = drawings['current-balance'];
  if (kind === 'voltage-run' && run) return <VoltageRun title={title} data={run} />;
  if (kind === 'charge-curve' && curve) return <ChargeCurve title={title} data={curve} />;
  if (kind === 'source-timeline' && timeline)
    return <SourceTimeline title={title} data={timeline} />;
  if (kind === 'current-balance' && balance) return <CurrentBalance title={title} data={balance} />;
  return null;
}

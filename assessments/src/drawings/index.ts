import { drawChargeCurve } from './charge-curve.ts';
import { drawCurrentBalance } from './current-balance.ts';
import { drawSourceTimeline } from './source-timeline.ts';
import { type DrawingData } from './types.ts';
import { drawVoltageRun } from './voltage-run.ts';

export type DrawingKind = DrawingData['kind'];

const DRAWN: Readonly<Record<DrawingKind, () => DrawingData>> = {
  'voltage-run': drawVoltageRun,
  'charge-curve': drawChargeCurve,
  'source-timeline': drawSourceTimeline,
  'current-balance': drawCurrentBalance,
};

/** Drawings a lesson may hold for its reader to handle. */
export const DRAWING_KINDS = Object.keys(DRAWN) as readonly DrawingKind[];

/** Works the data of a drawing out. */
export const drawingData = (kind: DrawingKind): DrawingData => DRAWN[kind]();

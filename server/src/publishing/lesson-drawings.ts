/** Drawings a reader can handle; each is computed from the trade's own arithmetic. */
export const DRAWING_KINDS = [
  'voltage-run',
  'charge-curve',
  'source-timeline',
  'current-balance',
] as const;
export type DrawingKind = (typeof DRAWING_KINDS)[number];

export const isDrawingKind = (kind: string): kind is DrawingKind =>
  DRAWING_KINDS.some((known) => known === kind);

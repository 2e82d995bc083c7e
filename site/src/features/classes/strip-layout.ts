import { type ClassView, type MemberView } from './queries.ts';

export interface StripSize {
  dotGap: number;
  unitGap: number;
  dot: number;
  lamp: number;
  height: number;
}

// The same strip twice: beside the name on a desk, under it on a phone.
export const wideStrip: StripSize = { dotGap: 19, unitGap: 16, dot: 4.6, lamp: 7.5, height: 30 };
export const narrowStrip: StripSize = { dotGap: 12, unitGap: 12, dot: 3.6, lamp: 6.4, height: 24 };

export type DotState = 'done' | 'begun' | 'open';

export interface PlacedUnit {
  number: number;
  from: number;
  /** How far its line is live; null when not at all. */
  liveTo: number | null;
  to: number;
  dots: { x: number; state: DotState }[];
  lamp: { x: number; state: MemberView['units'][number]['lamp'] } | null;
}

type Head = ClassView['units'][number];

/** The course map on its side: for each unit its sheets, then the lamp of its worksheet. */
export function layStrip(
  heads: Head[],
  member: Pick<MemberView, 'units'> | null,
  size: StripSize,
): { units: PlacedUnit[]; paperX: number; width: number } {
  let x = size.lamp + 1;
  const units = heads.map((head) => {
    const own = member?.units.find(({ number }) => number === head.number);
    const unit = layUnit(head, { own, from: x, size });
    x = unit.to + (unit.lamp ? size.lamp : size.dot) + size.unitGap;
    return unit;
  });
  return { units, paperX: x, width: x + size.lamp + 2 };
}

interface Place {
  own: OwnUnit | undefined;
  from: number;
  size: StripSize;
}

function layUnit(head: Head, { own, from, size }: Place): PlacedUnit {
  const dots = Array.from({ length: head.sheets }, (_, index) => ({
    x: from + index * size.dotGap,
    state: dotState(index, own),
  }));
  const lampX = from + head.sheets * size.dotGap;
  const lamp = head.worksheet === null ? null : { x: lampX, state: own?.lamp ?? 'not-sat' };
  const to = lamp ? lampX : (dots.at(-1)?.x ?? from + size.dotGap / 2);
  return { number: head.number, from, to, dots, lamp, liveTo: liveTo(dots, to) };
}

/** Live down to the last sheet begun; all read, down to the lamp. */
function liveTo(dots: PlacedUnit['dots'], to: number): number | null {
  const last = dots.findLast(({ state }) => state !== 'open');
  if (!last) return null;
  return dots.every(({ state }) => state === 'done') ? to : last.x;
}

type OwnUnit = Pick<MemberView['units'][number], 'sheetsDone' | 'sheetsBegun' | 'lamp'>;

function dotState(index: number, own: OwnUnit | undefined): DotState {
  if (!own) return 'open';
  if (index < own.sheetsDone) return 'done';
  return index < own.sheetsDone + own.sheetsBegun ? 'begun' : 'open';
}

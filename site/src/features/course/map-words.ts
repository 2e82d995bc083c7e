import { sayDate } from '../../ui/dates.ts';
import { type TerminalState } from '../../ui/symbols/terminal.tsx';
import { type PaperView, type SheetView, type UnitView, type WorksheetOfUnit } from './queries.ts';

const terminals: Record<SheetView['state'], TerminalState> = {
  'not-begun': 'open',
  begun: 'begun',
  done: 'done',
};

export function terminalOf({ state }: SheetView): TerminalState {
  return terminals[state];
}

const sheetWords: Record<SheetView['state'], string> = {
  'not-begun': 'not begun',
  begun: 'begun',
  done: 'done',
};

/** "done, revised since" */
export function saySheetState({ state, revised }: SheetView): string {
  return revised ? `${sheetWords[state]}, revised since` : sheetWords[state];
}

export function countDone(unit: UnitView): number {
  return unit.sheets.filter(({ state }) => state === 'done').length;
}

/** How far down a way its conductor is live: the index of the last sheet begun, or -1. */
export function lastLiveSheet(unit: UnitView): number {
  return unit.sheets.findLastIndex(({ state }) => state !== 'not-begun');
}

/** Beside the lamp: "92 %, passed" is set apart, so the figure comes on its own. */
export function sayWorksheet(worksheet: WorksheetOfUnit): { percent: number | null; word: string } {
  const percent = worksheet.best?.percent ?? null;
  if (worksheet.lit) return { percent, word: 'passed' };
  if (worksheet.openAttemptId) return { percent: null, word: 'open' };
  return { percent, word: percent === null ? 'not worked yet' : 'not passed' };
}

/** The state column of the schedule. */
export function sayUnitState(unit: UnitView): string {
  if (!unit.issued) return 'Not yet issued';
  const revised = unit.sheets.find((sheet) => sheet.revised);
  const state = sayProgress(unit);
  return revised ? `${state}; sheet ${revised.number} revised` : state;
}

function sayProgress(unit: UnitView): string {
  const { worksheet } = unit;
  if (worksheet?.lit) return 'Worksheet passed';
  if (worksheet?.openAttemptId) return 'Worksheet open';
  if (worksheet?.best) return 'Worksheet not passed';
  if (countDone(unit) === unit.sheets.length) return worksheet ? 'Read, worksheet to work' : 'Read';
  return lastLiveSheet(unit) < 0 ? 'Ready to begin' : 'Begun';
}

/** Under "Final paper" on the map and in the schedule. */
export function sayPaper(paper: PaperView): string {
  if (paper.state === 'passed') return 'passed';
  if (paper.state === 'sitting') return 'being sat now';
  if (paper.state === 'waiting') {
    return paper.mayStartAt ? `again from ${sayDate(paper.mayStartAt)}` : 'not open yet';
  }
  return 'not sat';
}

/** Where a way of the map leads: the first sheet not done, else its first. */
export function unitPath(unit: UnitView): string | null {
  const sheet = unit.sheets.find(({ state }) => state !== 'done') ?? unit.sheets[0];
  return sheet ? `/sheets/${sheet.number}` : null;
}

export function paperPath({ slug, state, sittingId }: PaperView): string {
  return state === 'sitting' && sittingId ? `/sittings/${sittingId}` : `/papers/${slug}`;
}

/** A unit's name short enough for the fore-edge: "1 Circuits". */
export function thumbLabel({ number, title }: UnitView): string {
  return `${number} ${title.split(/,| and /)[0] ?? title}`;
}

import { type ClassView, type MemberView } from './queries.ts';

const week = 7;
const dayMs = 86_400_000;
const allRead = 'all read';

const words = 'no one two three four five six seven eight nine ten eleven twelve'.split(' ');

function sayCount(count: number): string {
  return words[count] ?? String(count);
}

function capital(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1);
}

export function nameOf({ givenName, familyName }: MemberView): string {
  return `${givenName} ${familyName}`.trim();
}

/** A week or more on one sheet. */
export function isStuck({ at, daysThere }: MemberView): boolean {
  return at !== allRead && daysThere >= week;
}

/** Every lamp lit, and the paper still to sit. */
export function isReadyToSit({ units, paper }: MemberView): boolean {
  const lamps = units.filter(({ lamp }) => lamp !== 'none');
  return paper === 'not-sat' && lamps.length > 0 && lamps.every(({ lamp }) => lamp === 'lit');
}

function isAway({ lastSeenOn }: MemberView, now: Date): boolean {
  return lastSeenOn === null || now.getTime() - Date.parse(lastSeenOn) >= week * dayMs;
}

export const filters = ['all', 'stuck', 'ready', 'away'] as const;
export type Filter = (typeof filters)[number];

/** Who belongs under a filter. */
export function membersUnder(filter: Filter, members: MemberView[], now: Date): MemberView[] {
  const belongs: Record<Filter, (member: MemberView) => boolean> = {
    all: () => true,
    stuck: isStuck,
    ready: isReadyToSit,
    away: (member) => isAway(member, now),
  };
  return members.filter(belongs[filter]);
}

/** "Twelve on the course. Four have been on one sheet for a week or more, three of them on 3.4." */
export function sayClass({ members }: ClassView): string {
  const here = `${capital(sayCount(members.length))} on the course.`;
  const stuck = members.filter(isStuck);
  if (stuck.length === 0) return `${here} Nobody has been on one sheet for a week.`;
  const has = stuck.length === 1 ? 'has' : 'have';
  return `${here} ${capital(sayCount(stuck.length))} ${has} been on one sheet for a week or more, ${sayWhere(stuck)}.`;
}

function sayWhere(stuck: MemberView[]): string {
  const counts = new Map<string, number>();
  for (const { at } of stuck) {
    const sheet = at.split(' ')[0] ?? at;
    counts.set(sheet, (counts.get(sheet) ?? 0) + 1);
  }
  const [sheet = '', count = 0] = [...counts].sort(([, a], [, b]) => b - a)[0] ?? [];
  return count === stuck.length ? `on ${sheet}` : `${sayCount(count)} of them on ${sheet}`;
}

/** The map strip in words. */
export function sayStrip({ units: heads }: ClassView, { units, paper }: MemberView): string {
  const done = units.reduce((sum, { sheetsDone }) => sum + sheetsDone, 0);
  const of = heads.reduce((sum, { sheets }) => sum + sheets, 0);
  const worksheets = heads.flatMap(({ number, worksheet }) => {
    const lamp = units.find((unit) => unit.number === number)?.lamp;
    if (!worksheet || (lamp !== 'lit' && lamp !== 'not-passed')) return [];
    return [`${worksheet} ${lamp === 'lit' ? 'passed' : 'not passed'}`];
  });
  const sayings = [`${done} of ${of} sheets done`, ...worksheets, sayPaper(paper)];
  return sayings.filter(Boolean).join(', ');
}

function sayPaper(paper: MemberView['paper']): string {
  if (paper === 'not-sat') return '';
  return { sitting: 'paper being sat', passed: 'paper passed', 'not-passed': 'paper not passed' }[
    paper
  ];
}

import { localDay } from '../clock/local-day.ts';
import { unitsOf, type MapRecords } from '../courses/course-map.ts';
import { currentSheet } from '../lessons/current-sheet.ts';
import type { ClassMember } from './class-records.ts';
import type { ClassView } from './class-view.schemas.ts';

type MemberView = ClassView['members'][number];
type UnitView = MemberView['units'][number];

const DAY_MS = 86_400_000;
const ALL_READ = 'all read';

function lampOf({ worksheet }: ReturnType<typeof unitsOf>[number]): UnitView['lamp'] {
  if (!worksheet) return 'none';
  if (worksheet.lit) return 'lit';
  return worksheet.best ? 'not-passed' : 'not-sat';
}

function unitRows(records: MapRecords): UnitView[] {
  return unitsOf(records).map((unit) => ({
    number: unit.number,
    sheetsDone: unit.sheets.filter(({ state }) => state === 'done').length,
    sheetsBegun: unit.sheets.filter(({ state }) => state === 'begun').length,
    lamp: lampOf(unit),
    percent: unit.worksheet?.best?.percent ?? null,
  }));
}

function daysBetween(from: Date, to: Date, zone: string): number {
  const midnight = (instant: Date) => Date.parse(`${localDay(instant, zone)}T00:00:00Z`);
  return Math.max(0, Math.round((midnight(to) - midnight(from)) / DAY_MS));
}

/** The sheet a person is on and since when: begun then, or free for it since the last was done. */
function placeOf(member: ClassMember, records: MapRecords): { at: string; since: Date } {
  const { course, lessons, progress } = records;
  const current = currentSheet(
    course.units.flatMap(({ sheets }) => sheets),
    progress,
  );
  const dones = [...progress.values()].flatMap(({ doneAt }) => doneAt ?? []);
  const free = new Date(Math.max(member.joinedAt.getTime(), ...dones.map((at) => at.getTime())));
  if (!current) return { at: ALL_READ, since: free };
  const title = lessons.get(current.number)?.title ?? '';
  return { at: `${current.number} ${title}`.trim(), since: current.begun?.begunAt ?? free };
}

function attemptRows({ attempts, course }: MapRecords): MemberView['attempts'] {
  return attempts.flatMap(({ id, worksheet, attempt, handedInAt, marks, outOf }) =>
    handedInAt === null || marks === null
      ? []
      : [{ id, worksheet, attempt, handedInOn: localDay(handedInAt, course.zone), marks, outOf }],
  );
}

/** One trainee's row of the class view. */
export function memberRow(
  member: ClassMember,
  records: MapRecords,
  { paper, now }: { paper: MemberView['paper']; now: Date },
): MemberView {
  const { zone } = records.course;
  const { at, since } = placeOf(member, records);
  return {
    id: member.id,
    givenName: member.givenName,
    familyName: member.familyName,
    joinedOn: localDay(member.joinedAt, zone),
    lastSeenOn: member.lastSeenAt && localDay(member.lastSeenAt, zone),
    at,
    daysThere: daysBetween(since, now, zone),
    units: unitRows(records),
    paper,
    attempts: attemptRows(records),
  };
}

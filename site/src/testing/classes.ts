import { type Answer } from '../api/views.ts';

type ClassView = Answer<'ClassView_view'>;
type MemberView = ClassView['members'][number];

/** On sheet 3.4, with unit 1 done and its lamp lit. */
export function makeMember(more: Partial<MemberView> = {}): MemberView {
  const unit = { sheetsDone: 0, sheetsBegun: 0, percent: null };
  return {
    id: 'm1',
    givenName: 'Ifeoma',
    familyName: 'Castellan',
    joinedOn: '2026-09-14',
    lastSeenOn: '2026-12-01',
    daysThere: 2,
    at: '3.4 The long run',
    units: [
      { ...unit, number: 1, sheetsDone: 1, lamp: 'lit', percent: 92 },
      { ...unit, number: 2, lamp: 'none' },
      { ...unit, number: 3, sheetsBegun: 1, lamp: 'not-sat' },
    ],
    paper: 'not-sat',
    attempts: [],
    ...more,
  };
}

export function makeClass(more: Partial<ClassView> = {}): ClassView {
  return {
    id: '7d0f6a52-0c5e-4f3e-9a3b-3f1c9b6a0100',
    name: 'Autumn 2026',
    school: 'Harrow Quay Technical School',
    course: { number: 'HQ-DC2', title: 'Auxiliary DC systems: installation' },
    startsOn: '2026-09-14',
    endsOn: '2026-12-18',
    joinCode: 'HQ26-A7KM',
    trainers: ['O. Marchetti'],
    units: [
      { number: 1, title: 'Circuits and safe isolation', sheets: 1, worksheet: 'W1' },
      { number: 2, title: 'Conductors and terminations', sheets: 0, worksheet: null },
      { number: 3, title: 'Voltage drop', sheets: 1, worksheet: 'W3' },
    ],
    members: [makeMember()],
    slips: [],
    tooFew: true,
    ...more,
  };
}

import { expect, it } from 'vitest';
import { makeCourseMap } from '../../testing/course-map.ts';
import { nextStep } from './next-step.ts';

const map = makeCourseMap();
const paper = map.paper;
if (!paper) throw new Error('The map of these tests has a paper.');

it('puts a running paper before everything else', () => {
  const step = nextStep({ ...map, paper: { ...paper, state: 'sitting', sittingId: 's1' } });
  expect(step).toMatchObject({ label: 'Go on with the paper', to: '/sittings/s1' });
});

it('begins a sheet that has not been begun at its top', () => {
  const carryOn = { sheet: '4.1', title: 'What it carries', paragraph: 1, of: 9, minutesLeft: 12 };
  expect(nextStep({ ...map, carryOn })).toMatchObject({
    label: 'Begin sheet 4.1',
    to: '/sheets/4.1',
  });
});

it('comes to the dark worksheets once all is read, then to the paper', () => {
  expect(nextStep({ ...map, carryOn: null })).toMatchObject({ to: '/worksheets/W3' });
  const lit = map.units.map((unit) => ({
    ...unit,
    worksheet: unit.worksheet && { ...unit.worksheet, lit: true },
  }));
  expect(nextStep({ ...map, carryOn: null, units: lit })).toMatchObject({
    to: '/papers/final-paper',
  });
});

it('has nothing to offer while the paper waits and all else is done', () => {
  const lit = map.units.map((unit) => ({ ...unit, worksheet: null }));
  const waiting = { ...paper, state: 'waiting' as const };
  expect(nextStep({ ...map, carryOn: null, units: lit, paper: waiting })).toBeNull();
});

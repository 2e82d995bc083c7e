import { describe, expect, it } from 'vitest';
import { workSums } from './sums.ts';

const texts = (source: unknown): Record<string, string> => {
  const { printed, issues } = workSums(source);
  expect(issues).toEqual([]);
  return Object.fromEntries([...printed].map(([name, { text }]) => [name, text]));
};
const issuesOf = (source: unknown): string[] =>
  workSums(source).issues.map(({ field, message }) => `${field.join('.')}: ${message}`);

describe('sums of a lesson', () => {
  it('come out as by hand, with their units and figures', () => {
    // 4.95 mΩ/m is IEC 60228 class 5, 4 mm² (from memory); the rest is Ohm's law by bc.
    expect(
      texts({
        given: { load: '14 A', run: '5.5 m', area: '4 mm²', supply: '12.80 V' },
        steps: {
          pair: { unit: 'mΩ', is: '2 * run * tableOhms(area)', figures: 4 },
          fall: { unit: 'V', is: 'load * pair' },
          share: { unit: '%', is: 'fall / supply', figures: 2 },
          fuse: { unit: 'A', is: 'nextFuse(load * 1.25)', figures: null },
        },
      }),
    ).toEqual({
      load: '14\u00a0A',
      run: '5.5\u00a0m',
      area: '4\u00a0mm²',
      supply: '12.80\u00a0V',
      pair: '54.45\u00a0mΩ',
      fall: '0.762\u00a0V',
      share: '6.0\u00a0%',
      fuse: '20\u00a0A',
    });
  });

  it('print pure numbers, gauges by their names, cold, and small figures with raised powers', () => {
    expect(
      texts({
        profile: 'awg',
        given: { lamps: 4, wire: '1/0 AWG', frost: '-15 °C', leak: '0.000002 A' },
        steps: {
          each: { is: 'lamps / 8', figures: 1 },
          next: { unit: 'AWG', is: 'nextGauge(gaugeArea(wire) * 1.1)' },
          tiny: { unit: 'A', is: 'leak * 2', figures: 2 },
        },
      }),
    ).toEqual({
      lamps: '4',
      wire: '1/0\u00a0AWG',
      frost: '−15\u00a0°C',
      leak: '0.000002\u00a0A',
      each: '0.5',
      next: '2/0\u00a0AWG',
      tiny: '4.0 × 10⁻⁶\u00a0A',
    });
  });

  it.each<[string, unknown, string]>([
    [
      'a sum that does not balance',
      { given: { load: '14 A' }, steps: { fall: { unit: 'V', is: 'load * 2' } } },
      'steps.fall: The sum does not come out in V; check it or its unit.',
    ],
    [
      'units that do not match',
      { given: { load: '14 A', run: '5 m' }, steps: { fall: { unit: 'A', is: 'load + run' } } },
      'steps.fall: Units do not match: A + m; both sides must be the same kind of quantity.',
    ],
    [
      'a name that is declared later',
      { steps: { one: { is: 'two' }, two: { is: '2' } } },
      'steps.one: Name "two" is not declared before this line',
    ],
    ['a name that is a unit', { given: { A: '1 A' } }, 'given.A: a name is letters and digits'],
    ['a step named as a given', { given: { load: 2 }, steps: { load: { is: '3' } } }, 'steps.load'],
    ['a unit that is none', { given: { load: '3 blips' } }, 'given.load: "blips" is not a unit'],
    [
      'a figure no table holds',
      { given: { area: '5 mm²' }, steps: { ohms: { unit: 'Ω/m', is: 'tableOhms(area)' } } },
      'steps.ohms: ',
    ],
    ['nothing to divide by', { steps: { none: { is: '1 / 0' } } }, 'steps.none: Sum none comes to'],
    [
      'a key that is not known',
      { steps: { one: { is: '1', says: 'x' } } },
      'steps.one.says: there is no',
    ],
  ])('refuse %s', (_what, source, issue) => {
    expect(issuesOf(source)).toEqual([expect.stringContaining(issue)]);
  });

  it('tell one mistake once, not at every line that leans on it', () => {
    const steps = { wrong: { unit: 'V', is: '2' }, next: { unit: 'V', is: 'wrong * 2' } };
    expect(issuesOf({ steps })).toEqual([expect.stringContaining('steps.wrong')]);
  });
});

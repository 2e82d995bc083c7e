import { describe, expect, it } from '@jest/globals';
import { readOptions } from './options.mjs';
import { breachLine, headings, rowOf } from './table.mjs';

describe('the options of an audit', () => {
  it('are ten thousand draws of every question, or what is asked for', () => {
    expect(readOptions([])).toEqual({ only: null, draws: 10_000 });
    expect(readOptions(['--only', 'vd-cmil', '--draws', '500'])).toEqual({
      only: 'vd-cmil',
      draws: 500,
    });
  });

  it.each([[['--draws', 'many']], [['--only']], [['--draws', '0']], [['vd-cmil']]])(
    'are refused as %j, with the usage',
    (args) => expect(() => readOptions(args)).toThrow('Usage: npm run bank:audit'),
  );
});

describe('the table of an audit', () => {
  const part = { kind: 'quantity', unit: 'V', nearestSlip: 4.25, givenShare: 0.02 };
  const audit = {
    slug: 'vd-chart-table',
    rejectedShare: 0.061,
    parts: [
      { ...part, id: 'a', range: { least: 0.14012, most: 1.3671 } },
      { ...part, id: 'b', range: null, nearestSlip: null, givenShare: 0 },
    ],
    slips: [
      { is: 'One.', liveShare: 1 },
      { is: 'Two.', liveShare: 0.914 },
    ],
    papers: 162,
    msPerDraw: 0.0472,
  };

  it('has one figure below each heading, and the range of the answers', () => {
    const [row, ranges] = rowOf(audit).split('\n');
    expect(row.split(/\s{2,}/)).toEqual([
      'vd-chart-table',
      '6 %',
      '4.3 tol.',
      '91 %',
      '2 %',
      '162',
      '0.047',
    ]);
    expect(headings()).toHaveLength(row.length);
    expect(ranges.trim()).toBe('(a) 0.14 to 1.37 V');
  });

  it('says of a figure out of bounds what it must be and what to do', () => {
    const breach = {
      slug: 'x',
      figure: 'papers',
      value: '3',
      bound: 'at least 12',
      remedy: 'widen',
    };
    expect(breachLine(breach)).toBe('x: papers: 3, must be at least 12; widen.');
  });
});

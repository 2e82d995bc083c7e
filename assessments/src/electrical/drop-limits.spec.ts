import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { numberIn, readTable } from '../../test/reference/read-table.ts';
import {
  aircraftLimitV,
  CRITICAL_CIRCUITS,
  dropLimitV,
  dropShare,
  SOURCE_TO_BUS_PERCENT,
} from './drop-limits.ts';
import { OutOfRange } from './out-of-range.ts';
import { PROFILES } from './practice-profile.ts';

const rows = readTable('drop-limits.csv');

describe('drop limits', () => {
  it.each(rows.filter(({ rule }) => rule === 'aircraft'))(
    'of a $system_V V aircraft are volts',
    (row) => {
      const systemV = numberIn(row, 'system_V');
      expect(aircraftLimitV(systemV, 'continuous')).toBe(numberIn(row, 'continuous_V'));
      expect(aircraftLimitV(systemV, 'intermittent')).toBe(numberIn(row, 'intermittent_V'));
    },
  );

  it.each(rows.filter(({ percent }) => percent !== ''))('of $rule are $percent %', (row) => {
    const percent = numberIn(row, 'percent');
    if (row.rule === 'source to bus') {
      expect(SOURCE_TO_BUS_PERCENT).toBe(percent);
      return;
    }
    const kind = row.rule === 'critical' ? 'critical' : 'other';
    for (const profile of Object.values(PROFILES)) {
      for (const nominalV of [12, 24, 48]) {
        const limitV = dropLimitV(profile, { kind, nominalV });
        expect(limitV).toBeCloseTo((percent * nominalV) / 100, 12);
        expect(dropShare(limitV, { of: 'nominal', volts: nominalV }).percent).toBeCloseTo(percent);
      }
    }
  });

  it('come from the profile, never from a federal rule, which sets none for small craft', () => {
    // 33 CFR 183 subpart I and 46 CFR 183.340 and .380 name no share (read).
    const strict = { dropLimits: { criticalPercent: 2, otherPercent: 5 } };
    expect(dropLimitV(strict, { kind: 'critical', nominalV: 12 })).toBeCloseTo(0.24, 12);
    expect(dropLimitV(strict, { kind: 'other', nominalV: 12 })).toBeCloseTo(0.6, 12);
    expect(CRITICAL_CIRCUITS).toHaveLength(4);
  });

  it('say what a share is of: 0.382 V is 3.18 % of 12 V and 2.98 % of 12.8 V', () => {
    const nominal = dropShare(0.382, { of: 'nominal', volts: 12 });
    const source = dropShare(0.382, { of: 'source', volts: 12.8 });
    expect(nominal.of).toBe('nominal');
    expect(nominal.percent).toBeCloseTo(3.1833, 4);
    expect(source.of).toBe('source');
    expect(source.percent).toBeCloseTo(2.9844, 4);
    fc.assert(
      fc.property(
        fc.double({ min: 1, max: 60, noNaN: true }),
        fc.double({ min: 0, max: 1, noNaN: true }),
        (volts, share) => {
          const { percent } = dropShare(share * volts, { of: 'source', volts });
          expect(percent).toBeCloseTo(100 * share, 9);
        },
      ),
    );
  });

  it('refuse systems and shares that are none', () => {
    expect(() => aircraftLimitV(12, 'continuous')).toThrow('use one of 14, 28, 115, 200 V');
    const kind = 'critical';
    expect(() => dropLimitV(PROFILES.metric, { kind, nominalV: 230 })).toThrow('low voltage');
    expect(() => dropShare(13, { of: 'source', volts: 12 })).toThrow('loses no more');
    expect(() => dropShare(0.1, { of: 'source', volts: 0 })).toThrow(OutOfRange);
  });
});

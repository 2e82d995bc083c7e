import { describe, expect, it } from 'vitest';
import { balanceCurrents } from '../electrical/current-balance.ts';
import { DRAWING_KINDS, drawingData, type DrawingKind } from './index.ts';
import { type DrawingData } from './types.ts';

const dataOf = <K extends DrawingKind>(kind: K): Extract<DrawingData, { kind: K }> =>
  drawingData(kind) as Extract<DrawingData, { kind: K }>;

describe('drawings to handle', () => {
  it.each(DRAWING_KINDS)('%s is plain, finite, small, and names its source', (kind) => {
    const text = JSON.stringify(drawingData(kind));
    expect(JSON.parse(text)).toEqual(drawingData(kind));
    expect(text).not.toContain('null');
    expect(text.length).toBeLessThan(12_000);
    expect(drawingData(kind).source).toMatch(/memory|definition|no source/);
  });
});

describe('the voltage along a run', () => {
  const { areas, start, supplyV, limits } = dataOf('voltage-run');

  it('starts at the chart table, whose drop the course works by hand', () => {
    // 2 × 5.5 m × 14 A × 4.95 mΩ/m by bc; the table figure is IEC 60228 class 5 (from memory).
    const ohms = areas.find(({ areaMm2 }) => areaMm2 === start.areaMm2)?.ohmsPerM ?? NaN;
    expect(2 * start.lengthM * start.amps * ohms).toBeCloseTo(0.7623, 6);
    expect(supplyV).toBe(12.8);
  });

  it('names its limits in volts', () => {
    expect(limits.map(({ percent, volts }) => [percent, volts])).toEqual([
      [3, 0.36],
      [10, 1.2],
    ]);
  });
});

describe('the charge curve', () => {
  const { stages, settings, battery, points, hours } = dataOf('charge-curve');

  it('goes through the three stages without a gap', () => {
    expect(stages.map(({ name }) => name)).toEqual(['bulk', 'absorption', 'float']);
    expect(stages.map(({ fromH }) => fromH)).toEqual([0, stages[0]?.toH, stages[1]?.toH]);
    expect(stages.at(-1)?.toH).toBe(hours);
    expect(points.length).toBeGreaterThan(60);
  });

  it('holds the current in bulk and the voltage afterwards', () => {
    const [bulk, absorption, float] = stages;
    expect(bulk).toMatchObject({ from: { amps: 30 }, to: { amps: 30, volts: 14.4 } });
    expect(absorption?.from).toMatchObject({ volts: settings.absorptionV });
    expect(absorption?.to.amps).toBeLessThan(settings.tailA);
    expect(float?.to.volts).toBe(settings.floatV);
  });

  it('adds up: ampere-hours put in, and what of them stays', () => {
    const [bulk] = stages;
    const ah = settings.chargerA * (bulk?.toH ?? NaN);
    expect(bulk?.ah).toBeCloseTo(ah, 1);
    // 0.9 of them stay in a lead-acid battery (the model's figure, from memory).
    const gained = (100 * 0.9 * ah) / battery.capacityAh;
    expect(bulk?.to.chargePercent).toBeCloseTo(battery.startPercent + gained, 1);
  });
});

describe('the time line of sources', () => {
  const { events, spells, points, settings, minutes } = dataOf('source-timeline');

  it('waits its delay before each change-over', () => {
    const [on, taken, off, back] = events.map(({ minute }) => minute);
    expect([on, off]).toEqual([20, 45]);
    expect((taken ?? 0) - (on ?? 0)).toBe(settings.delayS / 60);
    expect((back ?? 0) - (off ?? 0)).toBe(settings.delayS / 60);
  });

  it('takes one source at a time, the vehicle first', () => {
    expect(spells.map(({ source, engine }) => `${source} ${String(engine)}`)).toEqual([
      'solar false',
      'solar true',
      'vehicle true',
      'vehicle false',
      'solar false',
    ]);
    expect(spells.map(({ chargerA }) => chargerA)).toEqual([6, 6, 30, 30, 6]);
    expect([spells[0]?.fromMinute, spells.at(-1)?.toMinute]).toEqual([0, minutes]);
  });

  it('draws constant power through its cable', () => {
    // By hand: 14.2 V less the volts at the input, over the pair of 12.1 mΩ, is the current in.
    const { inputV } = points.filter(({ minute }) => minute === 22).at(-1) ?? { inputV: NaN };
    const watts = ((14.2 - inputV) / 0.0121) * inputV;
    expect(watts * 0.92).toBeGreaterThan(30 * 12.3);
    expect(watts * 0.92).toBeLessThan(30 * 12.9);
  });

  it('falls under the release level when the engine stops', () => {
    const after = points.filter(({ minute }) => minute === 45).at(-1);
    expect(after?.inputV).toBeLessThan(settings.releaseV);
  });
});

describe('the balance of currents', () => {
  it('starts where the course works it', () => {
    const { chargerA, loads, bypass } = dataOf('current-balance');
    const clampedA = loads.reduce((sum, { amps }) => sum + amps, 0);
    const monitorA = chargerA.start - clampedA;
    expect(monitorA).toBeCloseTo(16.05, 9);
    expect(
      balanceCurrents({ chargerA: chargerA.start, monitorA, clampedA, bypassA: bypass.amps }),
    ).toMatchObject({ batteryA: expect.closeTo(13.65, 9) as number });
  });
});

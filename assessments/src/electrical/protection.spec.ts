import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { runNgspice } from '../../test/ngspice.ts';
import { numberIn, readTable } from '../../test/reference/read-table.ts';
import { bladeOpening } from './blade-band.ts';
import { classFiveOhmsPerKm } from './conductors.ts';
import { chooseDevice, mostSmallCraftA } from './device-choice.ts';
import { deviceInReach } from './device-place.ts';
import { canBreak, prospectiveAmps } from './fault-current.ts';
import { BLADE_A, BOLT_DOWN_A, NEC_240_6_A, preferredRatingsA } from './fuse-series.ts';
import { OutOfRange } from './out-of-range.ts';
import { ratingAmps } from './rating-table.ts';
import { CABLE_AREAS_MM2, FUSE_RATINGS_A, nextSize, prevSize } from './stock.ts';
import { dropAlong } from './voltage-drop.ts';

const printed = (series: string): number[] =>
  (readTable('fuse-ratings.csv').find((row) => row.series === series)?.ratings ?? '')
    .split(' ')
    .map(Number);

describe('ratings', () => {
  it('are those of each series, and blade and bolt-down in one row', () => {
    expect(BLADE_A).toEqual(printed('blade'));
    expect(BOLT_DOWN_A).toEqual(printed('bolt-down'));
    const both = [...new Set([...BLADE_A, ...BOLT_DOWN_A])].sort((a, b) => a - b);
    expect(FUSE_RATINGS_A).toEqual(both);
    expect(NEC_240_6_A).toEqual(printed('standard'));
  });

  it('have the 225 and 400 A that a copied list leaves out', () => {
    // A device for 210 A is 225 A; the copy would send it to 250 A.
    expect(nextSize(210, NEC_240_6_A)).toBe(225);
    expect(nextSize(360, NEC_240_6_A)).toBe(400);
  });

  it('of preferred numbers have ten or twenty steps a decade', () => {
    const between = { leastA: 0.315, mostA: 10 };
    const tens = preferredRatingsA(10, between);
    expect(tens.map((amps) => Math.round(amps * 1000))).toEqual(printed('r10'));
    const twenties = preferredRatingsA(20, between).map((amps) => Math.round(amps * 1000));
    for (const milliamps of printed('r20')) expect(twenties).toContain(milliamps);
    expect(preferredRatingsA(20, { leastA: 1, mostA: 9.99 })).toHaveLength(20);
    // Each step is the tenth or twentieth root of ten, rounded to the print: within 2.5 %.
    preferredRatingsA(20, { leastA: 0.01, mostA: 100 }).forEach((amps, index) => {
      expect(Math.abs(amps / (0.01 * 10 ** (index / 20)) - 1)).toBeLessThan(0.025);
    });
    expect(() => preferredRatingsA(10, { leastA: 0, mostA: 10 })).toThrow(OutOfRange);
    expect(() => preferredRatingsA(10, { leastA: 5, mostA: 1 })).toThrow('smaller bound first');
  });

  it('go up to the next and stay on one that fits', () => {
    expect(nextSize(7.02, CABLE_AREAS_MM2)).toBe(10);
    expect(nextSize(10 + 1e-12, CABLE_AREAS_MM2)).toBe(10);
    expect([12.5, 15].map((amps) => nextSize(amps, FUSE_RATINGS_A))).toEqual([15, 15]);
    expect([38, 40, 41].map((amps) => prevSize(amps, FUSE_RATINGS_A))).toEqual([35, 40, 40]);
    expect(() => nextSize(121, CABLE_AREAS_MM2)).toThrow('the series ends at 120');
    expect(() => nextSize(0, CABLE_AREAS_MM2)).toThrow(OutOfRange);
    expect(() => nextSize(NaN, CABLE_AREAS_MM2)).toThrow(OutOfRange);
    expect(() => prevSize(0.5, FUSE_RATINGS_A)).toThrow('the series starts at 1');
  });
});

describe('load, cable and device together', () => {
  it.each(readTable('fuse-choice.csv'))('$load_A A on a cable for $cable_A A: $fits', (row) => {
    const loadA = numberIn(row, 'load_A');
    const job = { loadA, continuous: true, cableA: numberIn(row, 'cable_A') };
    const choice = chooseDevice({ ...job, series: FUSE_RATINGS_A });
    expect(choice.needA).toBeCloseTo(numberIn(row, 'over_0_8_A'), 9);
    expect(choice.fits).toBe(row.fits === 'yes');
    const nextA = choice.fits ? choice.ratingA : choice.nextA;
    expect(nextA).toBe(numberIn(row, 'next_A'));
  });

  it('says to change the cable where no device fits', () => {
    const job = { loadA: 30, continuous: true, cableA: 35, series: FUSE_RATINGS_A };
    expect(chooseDevice(job)).toEqual({
      fits: false,
      needA: 37.5,
      nextA: 40,
      remedy: 'change the cable: it must carry 40 A and carries 35 A',
    });
    expect(chooseDevice({ ...job, continuous: false }).fits).toBe(true);
    const blade = chooseDevice({ ...job, loadA: 60, cableA: 120, series: BLADE_A });
    expect(blade).toMatchObject({ fits: false, nextA: null });
    expect(blade.fits ? '' : blade.remedy).toContain('share the load');
  });

  it('never leaves a cable to burn or a device to open on its load', () => {
    const job = fc.record({
      loadA: fc.double({ min: 0.1, max: 400, noNaN: true }),
      continuous: fc.boolean(),
      cableA: fc.double({ min: 1, max: 500, noNaN: true }),
      series: fc.constantFrom(FUSE_RATINGS_A, BLADE_A, NEC_240_6_A),
    });
    fc.assert(
      fc.property(job, (one) => {
        const choice = chooseDevice(one);
        expect(choice.needA).toBeGreaterThanOrEqual(one.loadA);
        const suits = (amps: number): boolean =>
          amps >= choice.needA * (1 - 1e-9) && amps <= one.cableA * (1 + 1e-9);
        if (choice.fits) {
          expect(suits(choice.ratingA)).toBe(true);
          expect(choice.spareA).toBeGreaterThanOrEqual(0);
        } else {
          expect(one.series.some(suits)).toBe(false);
        }
      }),
    );
    const job0 = { loadA: 0, continuous: true, cableA: 35, series: BLADE_A };
    expect(() => chooseDevice(job0)).toThrow('Current 0 A is outside 0.01 to 5000 A');
  });

  it('allows 150 % of the table under 50 V, which is not the same as good', () => {
    // 33 CFR 183.455 (second-hand copy): 10 mm² at 105 °C is 80 A in the table, 68 A in an engine space.
    const tableA = ratingAmps(10, 105);
    expect(mostSmallCraftA({ tableA, volts: 12 }, FUSE_RATINGS_A)).toBe(100);
    expect(mostSmallCraftA({ tableA, volts: 12 }, NEC_240_6_A)).toBe(110);
    expect(prevSize(0.85 * tableA, FUSE_RATINGS_A)).toBe(60);
    // From 50 V the table's own value, or the next rating up within 150 %.
    expect(mostSmallCraftA({ tableA: 80, volts: 60 }, FUSE_RATINGS_A)).toBe(80);
    expect(mostSmallCraftA({ tableA: 85, volts: 60 }, FUSE_RATINGS_A)).toBe(100);
    expect(mostSmallCraftA({ tableA: 85, volts: 60 }, [60, 150])).toBe(60);
    expect(
      [49.9, 50].map((volts) => mostSmallCraftA({ tableA: 80, volts }, FUSE_RATINGS_A)),
    ).toEqual([100, 80]);
    expect(mostSmallCraftA({ tableA: 0.5, volts: 12 }, FUSE_RATINGS_A)).toBeNull();
  });

  it('places the device within 7 in of its source, or 40 in where sheathed', () => {
    const at = (distanceMm: number, sheathed: boolean): boolean =>
      deviceInReach({ distanceMm, sheathed }).inReach;
    expect([at(177.8, false), at(178, false), at(1016, true), at(1017, true)]).toEqual([
      true,
      false,
      true,
      false,
    ]);
    expect(deviceInReach({ distanceMm: 300, sheathed: false }).mostMm).toBeCloseTo(7 * 25.4, 9);
    expect(() => deviceInReach({ distanceMm: -1, sheathed: true })).toThrow('measure along');
  });
});

describe('a short circuit', () => {
  it.each([
    { emf: 12.8, battery: 0.01, joints: 0.002, cable: 0.033 },
    { emf: 26.4, battery: 0.004, joints: 0.0005, cable: 0.001108 },
    { emf: 13.2, battery: 0.002, joints: 0.00015, cable: 0.0005 },
  ])('draws what the circuit simulator finds behind $battery Ω', (figures) => {
    const found = prospectiveAmps({
      openV: figures.emf,
      batteryOhms: figures.battery,
      cableOhms: figures.cable,
      jointOhms: figures.joints,
    });
    expect(found / (runNgspice('short-circuit.cir', figures).get('amps') ?? NaN)).toBeCloseTo(1, 7);
  });

  it('falls as cable is added, and a device must break more than it', () => {
    const pair = (lengthM: number, areaMm2: number): number =>
      dropAlong({ lengthM, ohmsPerKm: classFiveOhmsPerKm(areaMm2), amps: 1 });
    const near = { openV: 13.2, batteryOhms: 0.004, cableOhms: pair(1, 35), jointOhms: 0.0005 };
    const far = { ...near, cableOhms: near.cableOhms + pair(6, 16) };
    // 13.2 ÷ (4 + 0.5 + 1.108) mΩ and with 14.52 mΩ more.
    expect(prospectiveAmps(near)).toBeCloseTo(2353.78, 2);
    expect(prospectiveAmps(far)).toBeCloseTo(655.8, 1);
    const prospectiveA = prospectiveAmps(near);
    const breaks = [1000, 2000, 20_000].map((breakingA) => canBreak({ breakingA, prospectiveA }));
    expect(breaks.map((one) => one.breaks)).toEqual([false, false, true]);
    expect(canBreak({ breakingA: 2000, prospectiveA: 2000 })).toEqual({ breaks: true, spareA: 0 });
    expect(breaks[0]?.spareA).toBeCloseTo(-1353.78, 2);
  });

  it('is finite, grows with volts and shrinks with ohms', () => {
    const ohms = fc.double({ min: 1e-4, max: 1, noNaN: true });
    const path = fc.record({
      openV: fc.double({ min: 1, max: 60, noNaN: true }),
      batteryOhms: ohms,
      cableOhms: ohms,
      jointOhms: ohms,
    });
    fc.assert(
      fc.property(path, (one) => {
        const amps = prospectiveAmps(one);
        expect(Number.isFinite(amps)).toBe(true);
        expect(prospectiveAmps({ ...one, openV: 2 * one.openV }) / amps).toBeCloseTo(2, 9);
        const worse = { ...one, jointOhms: 2 * one.jointOhms };
        expect(prospectiveAmps(worse)).toBeLessThan(amps);
      }),
    );
  });

  it('needs a battery with a resistance and a device with a capacity', () => {
    const bare = { openV: 12.8, batteryOhms: 0, cableOhms: 0, jointOhms: 0 };
    expect(() => prospectiveAmps(bare)).toThrow('own resistance');
    expect(() => prospectiveAmps({ ...bare, cableOhms: -1 })).toThrow(OutOfRange);
    expect(() => canBreak({ breakingA: 0, prospectiveA: 100 })).toThrow('Breaking capacity 0 A');
  });
});

describe('the band of a blade fuse-link', () => {
  it.each([
    // ISO 8820-3 (from memory, times of low confidence).
    [1.1, 360_000, null],
    [1.35, 0.75, 600],
    [1.6, 0.25, 50],
    [2, 0.15, 5],
    [3.5, 0.04, 0.5],
  ])('at %d times its rating opens from %d to %s s', (multiple, leastS, mostS) => {
    expect(bladeOpening(multiple)).toEqual({ leastS, mostS, by: 'from memory' });
  });

  it('lies between the points on either side, and ends open below and above them', () => {
    expect(bladeOpening(1.8)).toMatchObject({ leastS: 0.15, mostS: 50 });
    expect(bladeOpening(0.8)).toMatchObject({ leastS: 360_000, mostS: null });
    expect(bladeOpening(1.2)).toMatchObject({ leastS: 0.75, mostS: null });
    expect(bladeOpening(10)).toMatchObject({ leastS: 0, mostS: 0.5 });
    expect(() => bladeOpening(NaN)).toThrow('divide the current by the rating');
  });

  it('opens sooner the more flows', () => {
    const multiple = fc.double({ min: 0, max: 20, noNaN: true });
    fc.assert(
      fc.property(multiple, multiple, (one, other) => {
        const [small, large] = [one, other].sort((a, b) => a - b).map(bladeOpening);
        expect(large?.leastS).toBeLessThanOrEqual(small?.leastS ?? 0);
        expect(large?.mostS ?? Infinity).toBeLessThanOrEqual(small?.mostS ?? Infinity);
      }),
    );
  });
});

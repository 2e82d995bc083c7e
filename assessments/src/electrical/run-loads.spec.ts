import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { runNgspice } from '../../test/ngspice.ts';
import { OutOfRange } from './out-of-range.ts';
import { dropsAlongRun, sharedReturnDrops } from './run-loads.ts';
import { seriesPath } from './series-path.ts';
import { dropAlong } from './voltage-drop.ts';

const TAPS = [
  { beyondM: 3, amps: 5 },
  { beyondM: 1.5, amps: 12 },
  { beyondM: 4, amps: 2.5 },
];
const amps = fc.double({ min: 0, max: 100, noNaN: true });
const metres = fc.double({ min: 0, max: 50, noNaN: true });

describe('several loads along one run', () => {
  it.each([
    ['a pair', 3.3],
    ['a chassis return', 0.2],
    ['a return that loses nothing', 1e-6],
  ])('lose what the circuit simulator finds, by %s', (_, backOhmsPerKm) => {
    const outOhmsPerKm = 3.3;
    const ohms = Object.fromEntries(
      TAPS.flatMap(({ beyondM }, index) => [
        [`out${index + 1}`, (beyondM * outOhmsPerKm) / 1000],
        [`back${index + 1}`, (beyondM * backOhmsPerKm) / 1000],
      ]),
    );
    const simulated = runNgspice('loads-along-run.cir', ohms);
    const found = dropsAlongRun({ outOhmsPerKm, backOhmsPerKm }, TAPS);
    const byTap = ['drop_a', 'drop_b', 'drop_c'].map((name) => simulated.get(name));
    found.forEach(({ dropV }, index) => expect(dropV).toBeCloseTo(byTap[index] ?? NaN, 7));
  });

  it('carry every load beyond a section', () => {
    const pair = { outOhmsPerKm: 3.3, backOhmsPerKm: 3.3 };
    const found = dropsAlongRun(pair, TAPS);
    expect(found.map(({ distanceM }) => distanceM)).toEqual([3, 4.5, 8.5]);
    expect(found.map(({ sectionAmps }) => sectionAmps)).toEqual([19.5, 14.5, 2.5]);
  });

  it('add up as if each load had the run to itself', () => {
    const tap = fc.record({ beyondM: metres, amps });
    fc.assert(
      fc.property(fc.array(tap, { minLength: 1, maxLength: 6 }), (taps) => {
        const found = dropsAlongRun({ outOhmsPerKm: 1.91, backOhmsPerKm: 1.91 }, taps);
        const last = found.at(-1);
        // Superposition: each load's current along its own way, all at the last tap.
        const alone = taps.reduce((sum, one, index) => {
          const lengthM = found[index]?.distanceM ?? NaN;
          return sum + dropAlong({ lengthM, ohmsPerKm: 1.91, amps: one.amps });
        }, 0);
        expect(last?.dropV).toBeCloseTo(alone, 6);
        found.forEach(({ dropV }, index) => {
          expect(dropV).toBeGreaterThanOrEqual(found[index - 1]?.dropV ?? 0);
        });
      }),
    );
  });

  it('refuse a run with no load and figures outside the trade', () => {
    const pair = { outOhmsPerKm: 3.3, backOhmsPerKm: 3.3 };
    expect(() => dropsAlongRun(pair, [])).toThrow('give a load');
    expect(() => dropsAlongRun(pair, [{ beyondM: -1, amps: 5 }])).toThrow('give metres one way');
    expect(() => dropsAlongRun({ ...pair, backOhmsPerKm: NaN }, TAPS)).toThrow(OutOfRange);
  });
});

describe('a shared return', () => {
  const FEEDS = [
    { feedOhms: 0.021, amps: 4 },
    { feedOhms: 0.008, amps: 35 },
    { feedOhms: 0.13, amps: 0.7 },
  ];

  it.each([0.002, 0.03])('of %d Ω loses what the circuit simulator finds', (back) => {
    const simulated = runNgspice('shared-return.cir', { back });
    const found = sharedReturnDrops(back, FEEDS);
    const byFeed = ['drop_a', 'drop_b', 'drop_c'].map((name) => simulated.get(name));
    found.forEach(({ dropV }, index) => expect(dropV).toBeCloseTo(byFeed[index] ?? NaN, 7));
    expect(found[0]?.sharedV).toBeCloseTo(simulated.get('v(r)') ?? NaN, 7);
  });

  it('takes volts from every circuit when one load grows', () => {
    fc.assert(
      fc.property(fc.double({ min: 0.5, max: 50, noNaN: true }), (more) => {
        const [lamp, winch] = FEEDS;
        if (!lamp || !winch) throw new Error('Two feeds are needed.');
        const before = sharedReturnDrops(0.01, [lamp, winch]);
        const after = sharedReturnDrops(0.01, [lamp, { ...winch, amps: winch.amps + more }]);
        const [was, is] = [before[0]?.dropV ?? NaN, after[0]?.dropV ?? NaN];
        expect(is - was).toBeCloseTo(0.01 * more, 9);
        expect(after[0]?.ownV).toBe(before[0]?.ownV);
      }),
    );
  });

  it('refuses to be shared by nothing', () => {
    expect(() => sharedReturnDrops(0.01, [])).toThrow('give a feed');
    expect(() => sharedReturnDrops(-0.01, FEEDS)).toThrow(OutOfRange);
  });
});

describe('one loop with its joints', () => {
  const loop = (joint: number): { is: string; ohms: number }[] => [
    { is: 'battery', ohms: 0.01 },
    { is: 'fuse', ohms: 0.002 },
    { is: 'positive', ohms: 0.0165 },
    { is: 'load', ohms: 1.2 },
    { is: 'negative to joint', ohms: 0.00825 },
    { is: 'joint', ohms: joint },
    { is: 'negative from joint', ohms: 0.00825 },
  ];

  it.each([
    // Worked outside this project in the same simulator: sound, and with a corroded joint.
    { joint: 0, amps: 10.2811245, load: 12.3373494, watts: 0 },
    { joint: 0.15, amps: 9.17562724, load: 11.01075269, watts: 12.62882 },
  ])('loses what the circuit simulator finds with $joint Ω in the return', (published) => {
    const simulated = runNgspice('run-joint.cir', {
      emf: 12.8,
      joint: Math.max(1e-12, published.joint),
    });
    const { amps: current, drops } = seriesPath(12.8, loop(published.joint));
    const across = (name: string): number => drops.find(({ is }) => is === name)?.volts ?? NaN;
    expect(current).toBeCloseTo(published.amps, 7);
    expect(current).toBeCloseTo(simulated.get('amps') ?? NaN, 6);
    expect(across('load')).toBeCloseTo(published.load, 7);
    expect(across('load')).toBeCloseTo(simulated.get('load_volts') ?? NaN, 6);
    const inJoint = (simulated.get('v(j1)') ?? NaN) - (simulated.get('v(j2)') ?? NaN);
    expect(across('joint')).toBeCloseTo(inJoint, 6);
    const heat = drops.find(({ is }) => is === 'joint')?.watts ?? NaN;
    expect(heat).toBeCloseTo(published.watts, 5);
    expect(heat).toBeCloseTo(simulated.get('joint_watts') ?? NaN, 5);
  });

  it.each([
    { celsius: 20, load: 12.5, wire: 0.75 },
    { celsius: 35, load: 12.42, wire: 0.79 },
  ])('agrees with the textbook at $celsius °C: $load V at the load', ({ celsius, load, wire }) => {
    // Lessons in Electric Circuits, vol. I ch. 12 (read): 15 Ω each way, its own 0.004041 /K; the
    // 14 V source and 250 Ω load are inferred from its print.
    const ohms = 15 * (1 + 0.004041 * (celsius - 20));
    const { drops } = seriesPath(14, [
      { is: 'out', ohms },
      { is: 'load', ohms: 250 },
      { is: 'back', ohms },
    ]);
    expect(drops.map(({ volts }) => Number(volts.toFixed(2)))).toEqual([wire, load, wire]);
  });

  it('shares out all the volts and all the heat', () => {
    const part = fc.record({
      is: fc.constant('part'),
      ohms: fc.double({ min: 0.001, max: 50, noNaN: true }),
    });
    fc.assert(
      fc.property(
        fc.double({ min: 0.1, max: 60, noNaN: true }),
        fc.array(part, { minLength: 1, maxLength: 8 }),
        (emfV, parts) => {
          const { amps: current, drops } = seriesPath(emfV, parts);
          const volts = drops.reduce((sum, drop) => sum + drop.volts, 0);
          const watts = drops.reduce((sum, drop) => sum + drop.watts, 0);
          expect(volts / emfV).toBeCloseTo(1, 9);
          expect(watts / (emfV * current)).toBeCloseTo(1, 9);
        },
      ),
    );
  });

  it('warms a lug of 2 mΩ by 28.8 W at 120 A', () => {
    const { amps: current, drops } = seriesPath(12, [
      { is: 'lug', ohms: 0.002 },
      { is: 'winch', ohms: 0.098 },
    ]);
    expect(current).toBeCloseTo(120, 9);
    expect(drops[0]?.volts).toBeCloseTo(0.24, 9);
    expect(drops[0]?.watts).toBeCloseTo(28.8, 9);
  });

  it('refuses a loop of no resistance', () => {
    expect(() => seriesPath(12, [{ is: 'spanner', ohms: 0 }])).toThrow('own resistance');
    expect(() => seriesPath(12, [])).toThrow(OutOfRange);
    expect(() => seriesPath(NaN, loop(0))).toThrow(OutOfRange);
  });
});

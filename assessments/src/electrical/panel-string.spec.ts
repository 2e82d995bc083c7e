import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { runNgspice } from '../../test/ngspice.ts';
import { bestPoint, type PanelString, stringAmps, stringVolts } from './panel-string.ts';
import { ampsAt, GENERIC_36_CELLS, openVolts, shareOf } from './single-diode.ts';

/** Two modules in series, each in two halves with a bypass diode; light on each half. */
function pair(light: readonly number[], hasBypass = true): PanelString {
  const groups = light.map((share) => shareOf(GENERIC_36_CELLS, { cells: 0.5, light: share }));
  return { groups, hasBypass };
}

function mostWatts(string: PanelString): number {
  const { volts, amps } = bestPoint(string);
  return volts * amps;
}

const FULL = pair([1, 1, 1, 1]);
const SHADED = pair([0.3, 1, 1, 1]);

describe('panels against a circuit simulator', () => {
  it.each([5, 16, 18, 20.5])('one module carries the same current at %d V', (volts) => {
    const found = runNgspice('panel-curve.cir', { volts });
    expect(ampsAt(GENERIC_36_CELLS, volts)).toBeCloseTo(found.get('amps') ?? NaN, 8);
    const best = bestPoint({ groups: [GENERIC_36_CELLS], hasBypass: false });
    expect(best.volts * best.amps).toBeCloseTo(found.get('watts') ?? NaN, 6);
  });

  it('one module, and two in series, stand at the same open-circuit voltage', () => {
    const found = runNgspice('panel-pair-open.cir');
    expect(openVolts(GENERIC_36_CELLS)).toBeCloseTo(found.get('v(d1)') ?? NaN, 9);
    const two = { groups: [GENERIC_36_CELLS, GENERIC_36_CELLS], hasBypass: false };
    expect(stringVolts(two, 0)).toBeCloseTo(found.get('v(sb)') ?? NaN, 9);
  });

  it.each([
    { light: [1, 1, 1, 1], volts: 36 },
    { light: [0.3, 1, 1, 1], volts: 26 },
    { light: [0.3, 1, 1, 1], volts: 38 },
    { light: [0.7, 0.7, 0.7, 0.7], volts: 30 },
    { light: [0, 1, 0.5, 1], volts: 20 },
  ])('a pair with light $light carries the same at $volts V, and its best', ({ light, volts }) => {
    const currents = Object.fromEntries(light.map((share, half) => [`light${half}`, share * 6]));
    const found = runNgspice('shaded-string.cir', { ...currents, volts });
    const string = pair(light);
    const amps = stringAmps(string, volts);
    expect(amps).toBeCloseTo(found.get('amps') ?? NaN, 6);
    const first = { ...string, groups: string.groups.slice(0, 2) };
    expect(stringVolts(first, amps)).toBeCloseTo(found.get('first') ?? NaN, 5);
    expect(mostWatts(string) / (found.get('watts') ?? NaN)).toBeCloseTo(1, 6);
  });
});

describe('a partly shaded string', () => {
  it('loses a quarter of its power and hardly any open-circuit voltage', () => {
    // Circuit simulator, with the leads of a site office: 197 W fall to 144 W, 43.64 V to 43.04 V.
    expect(stringVolts(FULL, 0) - stringVolts(SHADED, 0)).toBeCloseTo(0.6, 2);
    expect(mostWatts(SHADED) / mostWatts(FULL)).toBeCloseTo(144 / 197, 2);
  });

  it('has the shaded half passed by its diode at work', () => {
    const { amps } = bestPoint(SHADED);
    const shadedHalf = { groups: SHADED.groups.slice(0, 1), hasBypass: true };
    expect(stringVolts(shadedHalf, amps)).toBeGreaterThan(-0.7);
    expect(stringVolts(shadedHalf, amps)).toBeLessThan(-0.5);
  });

  it('without bypass diodes is held near the current of its darkest cells', () => {
    const { amps } = bestPoint(pair([0.3, 1, 1, 1], false));
    expect(amps).toBeLessThan(0.4 * GENERIC_36_CELLS.lightA);
    expect(mostWatts(pair([0.3, 1, 1, 1], false))).toBeLessThan(mostWatts(SHADED));
  });

  const share = fc.double({ min: 0, max: 1, noNaN: true });

  it('never gains by shade, and gives one current for one voltage and back', () => {
    fc.assert(
      fc.property(fc.array(share, { minLength: 4, maxLength: 4 }), share, (light, at) => {
        const string = pair(light);
        expect(mostWatts(string)).toBeLessThanOrEqual(mostWatts(FULL) + 1e-6);
        const openV = stringVolts(string, 0);
        const volts = at * openV;
        const amps = stringAmps(string, volts);
        expect(Number.isFinite(amps)).toBe(true);
        if (amps > 0) expect(stringVolts(string, amps)).toBeCloseTo(volts, 4);
      }),
      { numRuns: 12 },
    );
  });

  it('refuses no cells, and current or voltage the wrong way round', () => {
    expect(() => bestPoint({ groups: [], hasBypass: true })).toThrow('add a panel');
    expect(() => stringVolts(FULL, -1)).toThrow('below 0 A');
    expect(() => stringAmps(FULL, -1)).toThrow('turn its leads round');
  });
});

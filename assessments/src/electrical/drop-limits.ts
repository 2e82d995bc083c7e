import { OutOfRange, within } from './out-of-range.ts';
import { type PracticeProfile } from './practice-profile.ts';

/** What a circuit feeds, as small craft practice sorts them. */
export type CircuitKind = 'critical' | 'other';

/** Circuits whose loss of volts is a danger: ISO 10133 (second-hand copy). */
export const CRITICAL_CIRCUITS: readonly string[] = [
  'panel main feed',
  'navigation light',
  'bilge blower',
  'bilge pump',
];

/** Permitted drop of an aircraft's system, V: FAA AC 43.13-1B table 11-6. */
const AIRCRAFT_LIMITS_V = [
  // Continuous figures second-hand, intermittent ones from memory.
  { systemV: 14, continuous: 0.5, intermittent: 1 },
  { systemV: 28, continuous: 1, intermittent: 2 },
  { systemV: 115, continuous: 4, intermittent: 8 },
  { systemV: 200, continuous: 7, intermittent: 14 },
] as const;

/** Largest drop from source to bus, % of the regulated voltage: FAA handbook (second-hand copy). */
export const SOURCE_TO_BUS_PERCENT = 2;

/**
 * Drop a circuit may have by a practice, out and back, V. A practice, not a law: no federal rule
 * of the United States sets a share for small craft; local codes go first.
 *
 * Source: ISO 10133 (3 % second-hand copy, 10 % from memory).
 *
 * @throws {OutOfRange} when the nominal voltage is not above 0 and at most 60 V.
 * @example dropLimitV(PROFILES.metric, { kind: 'critical', nominalV: 12 }) // 0.36
 */
export function dropLimitV(
  profile: Pick<PracticeProfile, 'dropLimits'>,
  circuit: { kind: CircuitKind; nominalV: number },
): number {
  within(circuit.nominalV, {
    what: 'Nominal voltage',
    unit: 'V',
    least: 1,
    most: 60,
    remedy: 'these limits are for low voltage',
  });
  const { criticalPercent, otherPercent } = profile.dropLimits;
  const percent = circuit.kind === 'critical' ? criticalPercent : otherPercent;
  return (percent * circuit.nominalV) / 100;
}

/**
 * Drop an aircraft's circuit may have, V: for comparison, a voltage and not a share.
 *
 * Source: FAA AC 43.13-1B table 11-6 (continuous second-hand copy, intermittent from memory).
 *
 * @throws {OutOfRange} when the table has no such system.
 * @example aircraftLimitV(28, 'continuous') // 1
 */
export function aircraftLimitV(systemV: number, use: 'continuous' | 'intermittent'): number {
  const row = AIRCRAFT_LIMITS_V.find((one) => one.systemV === systemV);
  if (row) return row[use];
  const systems = AIRCRAFT_LIMITS_V.map((one) => one.systemV).join(', ');
  throw new OutOfRange(`Table 11-6 has no ${systemV} V system; use one of ${systems} V.`);
}

/**
 * A drop as a share, %, and of what: a limit in per cent means nothing without its base.
 *
 * @throws {OutOfRange} when the base is not above 0 V, or the drop negative or above it.
 * @example dropShare(0.382, { of: 'nominal', volts: 12 }) // { percent: 3.1833, of: 'nominal' }
 */
export function dropShare(
  dropV: number,
  base: { of: 'nominal' | 'source'; volts: number },
): { percent: number; of: 'nominal' | 'source' } {
  within(base.volts, {
    what: 'Voltage',
    unit: 'V',
    least: 1e-3,
    most: 1000,
    remedy: 'give the voltage the share is of',
  });
  within(dropV, {
    what: 'Drop',
    unit: 'V',
    least: 0,
    most: base.volts,
    remedy: 'a run loses no more than it is given',
  });
  return { percent: (100 * dropV) / base.volts, of: base.of };
}

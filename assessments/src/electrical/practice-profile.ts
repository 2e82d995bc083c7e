import { gaugeAreaMm2 } from './gauge.ts';

/** Practices a question may be asked under. */
export type PracticeName = 'metric' | 'awg';

/** What differs between places; every rule that leans on one of these takes it as an argument. */
export interface PracticeProfile {
  name: PracticeName;
  /** System the stock cable is bought in. */
  sizes: 'metric' | 'awg';
  /** Shares of the nominal voltage a circuit may lose, out and back, %. */
  dropLimits: { criticalPercent: number; otherPercent: number };
  /** How the ambient factor is found: by the square-root formula, or by the printed 5 K bins. */
  correction: 'formula' | 'bins';
  /** Table a single cable's rating is read from. */
  ratingTable: 'house' | 'small-craft';
  /** Jacket in °C to its factor in a 50 °C engine space. */
  engineFactors: Readonly<Record<number, number>>;
  /** Smallest copper a circuit may be wired in, mm²: alone, and inside a sheath. */
  smallestAreasMm2: { alone: number; sheathed: number };
}

/** Engine spaces at 50 °C: 33 CFR 183.425 note 1 (from memory). */
const NOTE_ONE: Readonly<Record<number, number>> = {
  60: 0.58,
  75: 0.75,
  80: 0.78,
  90: 0.82,
  105: 0.85,
  125: 0.89,
  200: 1,
};

/**
 * Shares lost: 3 % for panel mains, navigation lights, bilge blowers and bilge pumps (ISO 10133,
 * second-hand copy), 10 % for other circuits (the same, from memory). No federal rule of the
 * United States sets either.
 */
const DROP_LIMITS = { criticalPercent: 3, otherPercent: 10 };

/** The two practices by name. Neither is the law of a place: local codes go first. */
export const PROFILES: Readonly<Record<PracticeName, PracticeProfile>> = {
  metric: {
    name: 'metric',
    sizes: 'metric',
    dropLimits: DROP_LIMITS,
    correction: 'formula',
    ratingTable: 'house',
    // The house table has these four jackets alone.
    engineFactors: { 60: 0.58, 75: 0.75, 90: 0.82, 105: 0.85 },
    // ISO 10133:2012 clause 7 (second-hand copy).
    smallestAreasMm2: { alone: 1, sheathed: 0.75 },
  },
  awg: {
    name: 'awg',
    sizes: 'awg',
    dropLimits: DROP_LIMITS,
    correction: 'bins',
    ratingTable: 'small-craft',
    engineFactors: NOTE_ONE,
    // 16 and 18 AWG: 33 CFR 183.425(d) and (e) (second-hand copy).
    smallestAreasMm2: { alone: gaugeAreaMm2(16), sheathed: gaugeAreaMm2(18) },
  },
};

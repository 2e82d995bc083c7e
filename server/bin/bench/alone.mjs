import { electrical } from '@ferrule/assessments';
import { medianOf, repeated } from './rounds.mjs';

const rounds = 7;
const turn = { milliseconds: 60 };
const mostMilliseconds = 20;
const dayHours = 24;

/** A flooded bank of 220 Ah from a fifth, with a load that comes on at six: every stage is run. */
const day = {
  battery: electrical.batteryModel({ kind: 'flooded', blocks: 1, capacityAh: 220, celsius: 20 }),
  charge: 0.2,
  charger: {
    ...{ limitA: 30, absorptionV: 14.4, floatV: 13.6, tailA: 4.4, tailHoldH: 5 / 60 },
    longestAbsorptionH: 8,
  },
  load: { amps: 5, fromH: 6 },
  hours: dayHours,
  // The step of a question that runs a day.
  stepS: 60,
};

/** The charging model over a day, milliseconds of processor: bounded by itself, not by a ratio. */
export async function measureDay() {
  const work = () => electrical.logCharge(day);
  return {
    what: `Charging model, a curve of ${dayHours} h at steps of ${day.stepS} s`,
    milliseconds: await medianOf(repeated(work, turn), rounds),
    bound: mostMilliseconds,
  };
}

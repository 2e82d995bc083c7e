import { classFiveOhmsPerKm } from '../electrical/conductors.ts';
import { dropLimitV } from '../electrical/drop-limits.ts';
import { PROFILES } from '../electrical/practice-profile.ts';
import { CABLE_AREAS_MM2 } from '../electrical/stock.ts';
import { rounded } from './rounded.ts';
import { type VoltageRun } from './types.ts';

const NOMINAL_V = 12;
const LARGEST_MM2 = 50;

/** The chart table circuit of the course, to be made longer, thicker and heavier. */
export function drawVoltageRun(): VoltageRun {
  const { criticalPercent, otherPercent } = PROFILES.metric.dropLimits;
  const limitV = (kind: 'critical' | 'other'): number =>
    rounded(dropLimitV(PROFILES.metric, { kind, nominalV: NOMINAL_V }), 3);
  return {
    kind: 'voltage-run',
    supplyV: 12.8,
    start: { lengthM: 5.5, areaMm2: 4, amps: 14 },
    lengthM: { from: 1, to: 15, step: 0.5 },
    amps: { from: 1, to: 30, step: 1 },
    areas: CABLE_AREAS_MM2.filter((areaMm2) => areaMm2 <= LARGEST_MM2).map((areaMm2) => ({
      areaMm2,
      ohmsPerM: rounded(classFiveOhmsPerKm(areaMm2) / 1000, 9),
    })),
    limits: [
      {
        percent: criticalPercent,
        volts: limitV('critical'),
        label: `${criticalPercent} % of ${NOMINAL_V} V: panel feeds, charging leads, navigation lights, bilge pumps and blowers`,
      },
      {
        percent: otherPercent,
        volts: limitV('other'),
        label: `${otherPercent} % of ${NOMINAL_V} V: other circuits`,
      },
    ],
    source:
      'Class 5 copper at 20 °C: IEC 60228:2004, table 3 (from memory). Limits: the school’s practice profile, after ISO 10133 (3 % read in a second-hand copy, 10 % from memory); your local code decides.',
  };
}

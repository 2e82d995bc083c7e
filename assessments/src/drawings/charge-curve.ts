import { batteryModel } from '../electrical/charging/battery-model.ts';
import { logCharge } from '../electrical/charging/log-charge.ts';
import { type ChargeReading, totalsOf } from '../electrical/charging/readings.ts';
import { rounded } from './rounded.ts';
import { type ChargeCurve, type ChargeMoment } from './types.ts';

const SETTINGS = { chargerA: 30, absorptionV: 14.4, floatV: 13.6, tailA: 2.2 };
const CAPACITY_AH = 110;
const START = 0.5;
const HOURS = 5;
const MINUTES_APART = 3;
const TAIL_HOLD_H = 5 / 60;
const LONGEST_ABSORPTION_H = 8;

const momentOf = ({ volts, amps, charge }: ChargeReading): ChargeMoment => ({
  volts: rounded(volts, 2),
  amps: rounded(amps, 2),
  chargePercent: rounded(charge * 100, 1),
});

type StageName = ChargeCurve['stages'][number]['name'];

const SAYS: Record<StageName, string> = {
  bulk: `The charger gives all it has, ${SETTINGS.chargerA} A, and the voltage climbs. It ends when the voltage reaches ${SETTINGS.absorptionV} V.`,
  absorption: `The voltage is held at ${SETTINGS.absorptionV} V and the current falls away as the plates fill. It ends when the current has stayed under the tail of ${SETTINGS.tailA} A.`,
  float: `The voltage is let down to ${SETTINGS.floatV} V and held there. A full battery takes little; a load would be carried by the charger.`,
};

function readings(): ChargeReading[] {
  const { chargerA, absorptionV, floatV, tailA } = SETTINGS;
  const log = logCharge({
    battery: batteryModel({ kind: 'agm', capacityAh: CAPACITY_AH, blocks: 1 }),
    charge: START,
    charger: {
      ...{ limitA: chargerA, absorptionV, floatV, tailA },
      tailHoldH: TAIL_HOLD_H,
      longestAbsorptionH: LONGEST_ABSORPTION_H,
    },
    load: { amps: 0, fromH: 0 },
    hours: HOURS,
    stepS: 20,
  });
  return log.readings;
}

/** Every few minutes, and wherever a stage begins or ends. */
function pointsOf(log: readonly ChargeReading[]): ChargeCurve['points'] {
  let keptH = -Infinity;
  const kept = log.filter(({ hour, stage }, at) => {
    const isTurn = log[at - 1]?.stage !== stage || log[at + 1]?.stage !== stage;
    const isDue = (hour - keptH) * 60 >= MINUTES_APART - 1e-6;
    if (isDue) keptH = hour;
    return isTurn || isDue;
  });
  return kept.map((reading) => ({ hour: rounded(reading.hour, 4), ...momentOf(reading) }));
}

/** Until the voltage is down to float, no current flows: it belongs to float. */
const isIn =
  (name: StageName) =>
  ({ stage }: ChargeReading): boolean =>
    stage === name || (name === 'float' && stage === 'rest');

/** Where stages meet the log has a reading of each. */
function stageOf(log: readonly ChargeReading[], name: StageName): ChargeCurve['stages'][number] {
  const own = log.filter(isIn(name));
  const [first, last] = [own[0], own.at(-1)];
  if (!first || !last) throw new Error(`The curve shows no ${name}; mend its settings.`);
  return {
    name,
    fromH: rounded(first.hour, 4),
    toH: rounded(last.hour, 4),
    from: momentOf(first),
    to: momentOf(last),
    ah: rounded(totalsOf(own, null).chargerAh, 1),
    says: SAYS[name],
  };
}

/** A sealed lead-acid bank charged from half, by the course's own model. */
export function drawChargeCurve(): ChargeCurve {
  const log = readings();
  return {
    kind: 'charge-curve',
    settings: SETTINGS,
    battery: { name: 'AGM', capacityAh: CAPACITY_AH, startPercent: START * 100 },
    hours: HOURS,
    points: pointsOf(log),
    stages: (['bulk', 'absorption', 'float'] as const).map((name) => stageOf(log, name)),
    source:
      'Computed by the course’s charging model, which is illustrative and fitted to no battery. Set points lie in the range of general handbooks (from memory): the battery maker’s figures go first.',
  };
}

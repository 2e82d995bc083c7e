import { batteryModel } from '../electrical/charging/battery-model.ts';
import { type ChargeLog, logCharge } from '../electrical/charging/log-charge.ts';
import { type ChargeReading } from '../electrical/charging/readings.ts';
import { rounded } from './rounded.ts';
import { type SourceTimeline } from './types.ts';

const SETTINGS = { engageV: 13.2, releaseV: 12.8, delayS: 120, solarA: 6, chargerA: 30 };
const MINUTES = 60;
const ENGINE = { on: 20, off: 45 };
const ALTERNATOR_V = 14.2;
/** Pair of 5 m of 16 mm² class 5 copper, Ω. */
const CABLE_OHMS = 0.0121;

const MINUTES_PER_HOUR = 60;

function run(): ChargeLog {
  const { engageV, releaseV, delayS, solarA, chargerA } = SETTINGS;
  return logCharge({
    battery: batteryModel({ kind: 'agm', capacityAh: 110, blocks: 1 }),
    charge: 0.5,
    charger: {
      ...{ limitA: chargerA, absorptionV: 14.4, floatV: 13.6, tailA: 2.2 },
      ...{ tailHoldH: 5 / MINUTES_PER_HOUR, longestAbsorptionH: 8 },
    },
    load: { amps: 0, fromH: 0 },
    vehicle: {
      fromH: ENGINE.on / MINUTES_PER_HOUR,
      untilH: ENGINE.off / MINUTES_PER_HOUR,
      volts: ALTERNATOR_V,
      ...{ engageV, releaseV, delayH: delayS / 3600, hasOverride: false },
      ...{ cableOhms: CABLE_OHMS, efficiency: 0.92, charge: 0.9 },
      battery: batteryModel({ kind: 'flooded', capacityAh: 80, blocks: 1 }),
    },
    solar: { amps: solarA },
    hours: MINUTES / MINUTES_PER_HOUR,
    stepS: 10,
  });
}

const minuteOf = (hour: number): number => rounded(hour * MINUTES_PER_HOUR, 2);

interface Turn {
  minute: number;
  title: string;
  says: string;
  /** From here on. */
  spell: string;
}

function turnsOf({ vehicleTakenH, vehicleLetGoH }: ChargeLog): Turn[] {
  if (vehicleTakenH === null || vehicleLetGoH === null) {
    throw new Error('The time line shows no change of source; mend its settings.');
  }
  const { engageV, releaseV, delayS, solarA } = SETTINGS;
  const wait = `${delayS} s`;
  return [
    {
      minute: ENGINE.on,
      title: 'Vehicle on',
      says: `The engine starts and the vehicle input stands over the engage level of ${engageV} V. The charger sees it and waits ${wait}.`,
      spell:
        'The vehicle is seen and not yet engaged. The panel goes on charging: this is no fault.',
    },
    {
      minute: minuteOf(vehicleTakenH),
      title: 'Change-over',
      says: 'The voltage has held for the delay. The panel input is let go and the vehicle taken: one input at a time, the vehicle first.',
      spell:
        'The vehicle charges at full output. The panel stands idle in full sun, and that is right.',
    },
    {
      minute: ENGINE.off,
      title: 'Engine off',
      says: `The engine stops. Under the charger’s draw the vehicle input falls below the release level of ${releaseV} V, and the charger waits ${wait} again.`,
      spell: 'For the delay the charger still draws, now from the start battery.',
    },
    {
      minute: minuteOf(vehicleLetGoH),
      title: 'Back to solar',
      says: `The voltage has stayed under the release level for the delay. The vehicle is let go and the panel taken again at ${solarA} A.`,
      spell: 'The panel charges alone.',
    },
  ];
}

function spellsOf(turns: readonly Turn[], log: ChargeLog): SourceTimeline['spells'] {
  const before = { minute: 0, spell: 'The panel charges. The engine is off.' };
  const all = [before, ...turns];
  return all.map(({ minute, spell }, at) => {
    const toMinute = all[at + 1]?.minute ?? MINUTES;
    const middleH = (minute + toMinute) / 2 / MINUTES_PER_HOUR;
    const reading = log.readings.find(({ hour }) => hour >= middleH);
    if (!reading || reading.source === 'mains') throw new Error('The time line has no reading.');
    return {
      fromMinute: minute,
      toMinute,
      engine: minute >= ENGINE.on && minute < ENGINE.off,
      source: reading.source,
      chargerA: rounded(reading.amps, 1),
      says: spell,
    };
  });
}

/** Every minute, and both sides of every jump. */
function pointsOf(readings: readonly ChargeReading[]): SourceTimeline['points'] {
  const kept = readings.filter(({ hour }, at) => {
    const isJump = readings[at - 1]?.hour === hour || readings[at + 1]?.hour === hour;
    const minutes = hour * MINUTES_PER_HOUR;
    return isJump || Math.abs(minutes - Math.round(minutes)) < 1e-6;
  });
  return kept.map(({ hour, inputVolts, amps }) => ({
    minute: minuteOf(hour),
    inputV: rounded(inputVolts, 2),
    chargerA: rounded(amps, 1),
  }));
}

/** An hour with a panel in the sun and an engine that runs for half of it. */
export function drawSourceTimeline(): SourceTimeline {
  const log = run();
  const turns = turnsOf(log);
  return {
    kind: 'source-timeline',
    settings: SETTINGS,
    minutes: MINUTES,
    events: turns.map(({ minute, title, says }) => ({ minute, title, says })),
    spells: spellsOf(turns, log),
    points: pointsOf(log.readings),
    source:
      'Computed by the course’s charging model, which is illustrative. Vehicle before panel, after a delay: common practice, no source. Levels and delay differ between makes: their manual decides.',
  };
}

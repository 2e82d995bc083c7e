import { z } from 'zod';

const range = z.object({ from: z.number(), to: z.number(), step: z.number() });
const moment = { volts: z.number(), amps: z.number(), chargePercent: z.number() };
const source = z.string();

const voltageRun = z.object({
  kind: z.literal('voltage-run'),
  supplyV: z.number(),
  start: z.object({ lengthM: z.number(), areaMm2: z.number(), amps: z.number() }),
  lengthM: range,
  amps: range,
  /** One conductor of each size, at 20 °C. */
  areas: z.array(z.object({ areaMm2: z.number(), ohmsPerM: z.number() })),
  limits: z.array(z.object({ percent: z.number(), volts: z.number(), label: z.string() })),
  source,
});

const chargeCurve = z.object({
  kind: z.literal('charge-curve'),
  settings: z.object({
    chargerA: z.number(),
    absorptionV: z.number(),
    floatV: z.number(),
    tailA: z.number(),
  }),
  battery: z.object({ name: z.string(), capacityAh: z.number(), startPercent: z.number() }),
  hours: z.number(),
  points: z.array(z.object({ hour: z.number(), ...moment })),
  stages: z.array(
    z.object({
      name: z.enum(['bulk', 'absorption', 'float']),
      fromH: z.number(),
      toH: z.number(),
      from: z.object(moment),
      to: z.object(moment),
      ah: z.number(),
      says: z.string(),
    }),
  ),
  source,
});

const sourceTimeline = z.object({
  kind: z.literal('source-timeline'),
  settings: z.object({
    engageV: z.number(),
    releaseV: z.number(),
    delayS: z.number(),
    solarA: z.number(),
    chargerA: z.number(),
  }),
  minutes: z.number(),
  events: z.array(z.object({ minute: z.number(), title: z.string(), says: z.string() })),
  spells: z.array(
    z.object({
      fromMinute: z.number(),
      toMinute: z.number(),
      engine: z.boolean(),
      source: z.enum(['solar', 'vehicle', 'none']),
      chargerA: z.number(),
      says: z.string(),
    }),
  ),
  points: z.array(z.object({ minute: z.number(), inputV: z.number(), chargerA: z.number() })),
  source,
});

const load = z.object({ name: z.string(), amps: z.number(), isOn: z.boolean() });
const currentBalance = z.object({
  kind: z.literal('current-balance'),
  chargerA: range.extend({ start: z.number() }),
  loads: z.array(load),
  bypass: load,
  source,
});

/** Drawings a reader can handle, by kind; a sheet has few or none. */
export const drawingsSchema = z.object({
  'voltage-run': voltageRun.optional(),
  'charge-curve': chargeCurve.optional(),
  'source-timeline': sourceTimeline.optional(),
  'current-balance': currentBalance.optional(),
});

import { z } from 'zod';
import { figures, line, name, text } from './schema-words.ts';

/** What an interval may show. `rest` and `off` are one answer: the charger gives nothing. */
const stageWord = z.enum(['bulk', 'absorption', 'float', 'rest', 'off', 'cannot tell']);

const battery = z.strictObject({
  kind: z.enum(['flooded', 'agm', 'gel', 'lithium']),
  capacity: name,
  charge: name,
  blocks: z.int().min(1).max(4).default(1),
  temperature: name.optional(),
  aged: z.strictObject({ capacity: name, resistance: name }).optional(),
  protection: z.strictObject({ 'opens at': name, 'closes at': name.optional() }).optional(),
});

const charger = z.strictObject({
  limit: name,
  absorption: name,
  float: name.optional(),
  tail: name,
  'tail at': z.enum(['charger', 'battery']).optional(),
  'longest absorption': name.optional(),
  'least absorption': name.optional(),
  'after absorption': z.enum(['float', 'rest', 'hold']).optional(),
  restart: name.optional(),
  compensation: name.optional(),
  quiet: z.strictObject({ until: name }).optional(),
  derate: z.strictObject({ from: name, to: name, over: name.optional() }).optional(),
  lead: name.optional(),
  sense: z.enum(['charger', 'battery']).optional(),
  pauses: z.strictObject({ every: name, for: name }).optional(),
});

const vehicle = z.strictObject({
  from: name.optional(),
  until: name.optional(),
  volts: name,
  engage: name,
  release: name,
  delay: name,
  override: z.boolean().default(false),
  cable: name,
  efficiency: name,
  battery: z.strictObject({ capacity: name, charge: name }),
});

const solar = z.strictObject({
  amps: name,
  shade: z.strictObject({ from: name, until: name, amps: name }).optional(),
});

/** What a reading may be read off, by the words a sheet writes. */
const READINGS = [
  'bulk ends',
  'float starts',
  'absorption lasts',
  'amps before float',
  'quiet ends',
  'protection opens',
  'vehicle taken',
  'vehicle let go',
  'highest volts',
  'amp-hours in bulk',
  'amps at',
  'volts at',
  'battery amps at',
  'battery volts at',
  'input volts at',
] as const;

const reading = z.strictObject({
  symbol: line,
  unit: z.string().max(20),
  of: z.enum(READINGS),
  at: name.optional(),
  because: text,
  figures: figures.default(3),
  says: line.optional(),
});

/**
 * The `curve:` block of a sheet. Every setting is the name of a given value, so that a draw may vary
 * it; their units stand in bank/README.md.
 */
export const curve = z.strictObject({
  battery,
  charger,
  input: z.strictObject({ vehicle: vehicle.optional(), solar: solar.optional() }).optional(),
  load: z.strictObject({ amps: name, from: name.optional(), until: name.optional() }).optional(),
  hours: z.number().min(0.1).max(24),
  show: z.array(z.enum(['battery volts', 'battery amps', 'input volts'])).default([]),
  intervals: z
    .record(
      z.string().regex(/^[A-E]$/, 'intervals are lettered A to E'),
      z.union([
        stageWord,
        z.strictObject({ stage: stageWord, before: name.optional(), after: name.optional() }),
      ]),
    )
    .default({}),
  reads: z.record(name, reading).default({}),
  offer: z.array(z.enum(['rest', 'cannot tell'])).default([]),
});

export type CurveSheet = z.infer<typeof curve>;

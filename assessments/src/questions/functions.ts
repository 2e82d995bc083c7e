import { BATTERY_FUNCTIONS } from './functions-batteries.ts';
import { CONDUCTOR_FUNCTIONS } from './functions-conductors.ts';
import { CORE_FUNCTIONS } from './functions-core.ts';
import { PROTECTION_FUNCTIONS } from './functions-protection.ts';
import { RATING_FUNCTIONS } from './functions-rating.ts';
import { SOLAR_FUNCTIONS } from './functions-solar.ts';
import { type TradeFunction } from './trade-function.ts';

/** Functions a sheet may call, one list a topic. */
export const FUNCTIONS: ReadonlyMap<string, TradeFunction> = new Map<string, TradeFunction>([
  ...CORE_FUNCTIONS,
  ...CONDUCTOR_FUNCTIONS,
  ...RATING_FUNCTIONS,
  ...PROTECTION_FUNCTIONS,
  ...BATTERY_FUNCTIONS,
  ...SOLAR_FUNCTIONS,
]);

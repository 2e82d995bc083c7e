import { OutOfRange, within } from './out-of-range.ts';

/** One line of a load list. */
export interface DailyLoad {
  is: string;
  /** Drawn while it runs, W, at its own terminals. */
  watts: number;
  hoursPerDay: number;
  /** Share of those hours in which it really draws; 1 for a lamp, less for a compressor. */
  duty: number;
  /** Of an inverter or converter in front of it; 1 for none. */
  efficiency: number;
}

export interface DailyUse {
  ampHours: number;
  wattHours: number;
  lines: { is: string; ampHours: number }[];
}

/**
 * What a list of loads takes out of a bank in a day, at the bank's voltage.
 *
 * Source: energy is power times time; duty as a share of the hours is common practice, no source.
 *
 * @throws {OutOfRange} when a line makes no sense, naming it, or the list is empty.
 * @example
 * dailyUse([{ is: 'fridge', watts: 57.6, hoursPerDay: 24, duty: 0.35, efficiency: 1 }], 12.8)
 * // 37.8 Ah, 483.84 Wh
 */
export function dailyUse(loads: readonly DailyLoad[], bankV: number): DailyUse {
  if (loads.length === 0) throw new OutOfRange('The load list is empty; give at least one load.');
  within(bankV, {
    what: 'Bank voltage',
    unit: 'V',
    least: 6,
    most: 66,
    remedy: 'the course covers 12 V to 48 V nominal',
  });
  const lines = loads.map((load) => ({ is: load.is, ampHours: wattHoursOf(load) / bankV }));
  const ampHours = lines.reduce((sum, line) => sum + line.ampHours, 0);
  return { ampHours, wattHours: ampHours * bankV, lines };
}

function wattHoursOf({ is, watts, hoursPerDay, duty, efficiency }: DailyLoad): number {
  within(watts, {
    what: `Power of “${is}”`,
    unit: 'W',
    least: 0,
    most: 20_000,
    remedy: 'read it off its label',
  });
  within(hoursPerDay, {
    what: `Hours of “${is}”`,
    unit: 'h',
    least: 0,
    most: 24,
    remedy: 'a day has 24 hours',
  });
  within(duty, {
    what: `Duty of “${is}”`,
    unit: '',
    least: 0,
    most: 1,
    remedy: 'give it as a share: 35 % is 0.35',
  });
  within(efficiency, {
    what: `Efficiency in front of “${is}”`,
    unit: '',
    least: 0.3,
    most: 1,
    remedy: 'give it as a share, 1 for none',
  });
  return (watts * hoursPerDay * duty) / efficiency;
}

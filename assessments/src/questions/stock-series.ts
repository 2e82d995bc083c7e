import { BLADE_A, BOLT_DOWN_A } from '../electrical/fuse-series.ts';
import { STOCK_GAUGES } from '../electrical/gauge.ts';
import { CABLE_AREAS_MM2, FUSE_RATINGS_A } from '../electrical/stock.ts';
import { parseUnit } from './unit-expression.ts';
import { type Unit } from './units.ts';

export const STOCK_NAMES = ['cable', 'gauge', 'fuse', 'blade', 'bolt'] as const;
export type StockName = (typeof STOCK_NAMES)[number];

/** Stock a sheet may draw from or ask for, smallest first, figures in the unit. */
export const STOCK: Record<StockName, { sizes: readonly number[]; unit: Unit }> = {
  cable: { sizes: CABLE_AREAS_MM2, unit: parseUnit('mm²') },
  gauge: { sizes: [18, ...STOCK_GAUGES], unit: parseUnit('AWG') },
  fuse: { sizes: FUSE_RATINGS_A, unit: parseUnit('A') },
  blade: { sizes: BLADE_A, unit: parseUnit('A') },
  bolt: { sizes: BOLT_DOWN_A, unit: parseUnit('A') },
};

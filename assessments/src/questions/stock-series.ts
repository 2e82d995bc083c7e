import { CABLE_AREAS_MM2, FUSE_RATINGS_A } from '../electrical/stock.ts';
import { parseUnit } from './unit-expression.ts';
import { type Unit } from './units.ts';

/** Stock a sheet may draw from or ask for, figures in the unit. */
export const STOCK: Record<'cable' | 'fuse', { sizes: readonly number[]; unit: Unit }> = {
  cable: { sizes: CABLE_AREAS_MM2, unit: parseUnit('mm²') },
  fuse: { sizes: FUSE_RATINGS_A, unit: parseUnit('A') },
};

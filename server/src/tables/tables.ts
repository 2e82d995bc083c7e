import { chargeTables } from './charge-tables.ts';
import { circuitTables } from './circuit-tables.ts';
import { conductorTables } from './conductor-tables.ts';
import { ratingTables } from './rating-tables.ts';
import type { ReferenceTable } from './reference-table.ts';

/** Every table of the course, worked once from the library that marks its questions. */
export const TABLES: readonly ReferenceTable[] = [
  ...conductorTables(),
  ...ratingTables(),
  ...circuitTables(),
  ...chargeTables(),
];

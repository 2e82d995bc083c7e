import { Controller, Get } from '@nestjs/common';
import { Allow } from '../http/allow.decorator.ts';
import { Responds } from '../http/responds.decorator.ts';
import { SYMBOLS } from './symbols.ts';
import { TABLES } from './tables.ts';
import { tablesSchema, type TablesView } from './tables.schemas.ts';

const LOCAL =
  'Limits, factors, distances and permissions in these tables are the school’s practice profile, for training. Your local code decides, and the maker’s figures go before any table.';
const SYMBOLS_SOURCE =
  'Symbols after IEC 60617 (from memory); letters as on the school’s own drawings (common practice, no source).';

@Controller('api/tables')
export class TablesController {
  @Get()
  @Allow('signed-in')
  @Responds(200, tablesSchema)
  tables(): TablesView {
    return {
      tables: TABLES.map((table) => ({
        ...table,
        columns: [...table.columns],
        rows: table.rows.map(({ cells }) => ({ cells: [...cells] })),
        sources: [...table.sources],
      })),
      symbols: { source: SYMBOLS_SOURCE, list: [...SYMBOLS] },
      local: LOCAL,
    };
  }
}

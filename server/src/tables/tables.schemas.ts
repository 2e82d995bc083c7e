import { z } from 'zod';

export const tablesSchema = z.object({
  tables: z.array(
    z.object({
      slug: z.string(),
      title: z.string(),
      note: z.string(),
      /** The first heads its row. */
      columns: z.array(z.object({ label: z.string(), unit: z.string() })),
      /** Cells as printed; empty where the table has no figure. */
      rows: z.array(z.object({ cells: z.array(z.string()) })),
      sources: z.array(
        z.object({
          text: z.string(),
          provenance: z.enum([
            'read',
            'second-hand copy',
            'from memory',
            'computed',
            'common practice',
          ]),
        }),
      ),
      caution: z.string().nullable(),
    }),
  ),
  symbols: z.object({
    source: z.string(),
    list: z.array(
      z.object({
        slug: z.string(),
        letter: z.string(),
        name: z.string(),
        looks: z.string(),
        means: z.string(),
      }),
    ),
  }),
  /** What the local code decides. */
  local: z.string(),
});
export type TablesView = z.infer<typeof tablesSchema>;

import { z } from 'zod';

export const searchQuerySchema = z.strictObject({
  q: z.string().trim().min(1, 'type something to look for').max(100, 'at most 100 characters'),
});
export type SearchQuery = z.infer<typeof searchQuerySchema>;

export const foundSchema = z.object({
  query: z.string(),
  /** What was looked for in its place, since nothing holds the words as they were typed. */
  corrected: z.string().nullable(),
  /** There are more than are sent. */
  more: z.boolean(),
  /** Best first. */
  results: z.array(
    z.object({
      kind: z.enum(['sheet', 'paragraph', 'table', 'term']),
      title: z.string(),
      sheet: z.string().nullable(),
      paragraph: z.number().nullable(),
      heading: z.string().nullable(),
      /** Path and place on the page. */
      link: z.string(),
      /** Plain text; each mark is a stretch of it, from the first character to before the last. */
      snippet: z.object({
        text: z.string(),
        marks: z.array(z.object({ from: z.number(), to: z.number() })),
      }),
    }),
  ),
});
export type Found = z.infer<typeof foundSchema>;

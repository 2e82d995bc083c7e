import { z } from 'zod';

export const glossarySchema = z.object({
  language: z.string(),
  /** Null while no glossary is published: the lessons' own words stand alone. */
  revision: z.string().nullable(),
  terms: z.array(
    z.object({
      term: z.string(),
      /** Its place on the page. */
      anchor: z.string(),
      means: z.string(),
      also: z.array(z.string()),
      sheets: z.array(z.object({ number: z.string(), title: z.string() })),
    }),
  ),
});
export type GlossaryView = z.infer<typeof glossarySchema>;

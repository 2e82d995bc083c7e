import type pg from 'pg';
import { gatherTerms } from '../glossary/terms.ts';
import type { CompiledCourse } from '../publishing/compiled-course.ts';
import type { CompiledGlossary } from '../publishing/compiled-glossary.ts';
import type { CompiledLesson } from '../publishing/compiled-lesson.ts';
import { SYMBOLS } from '../tables/symbols.ts';
import { TABLES } from '../tables/tables.ts';
import { lessonEntries } from './lesson-entries.ts';
import { symbolEntry, tableEntry, termEntry } from './other-entries.ts';
import type { SearchEntry } from './search-entry.ts';
import { countWords } from './vocabulary.ts';

/** How PostgreSQL reads each language; any other by its words as they stand. */
const CONFIGURATIONS: Readonly<Record<string, string>> = {
  da: 'danish',
  de: 'german',
  en: 'english',
  es: 'spanish',
  fi: 'finnish',
  fr: 'french',
  it: 'italian',
  nl: 'dutch',
  no: 'norwegian',
  pt: 'portuguese',
  sv: 'swedish',
};

const configurationOf = (language: string) =>
  CONFIGURATIONS[language.split('-')[0] ?? ''] ?? 'simple';

async function currentOf<T>(client: pg.ClientBase, kind: string): Promise<T[]> {
  const { rows } = await client.query<{ compiled: T }>(
    `SELECT compiled FROM content_revisions WHERE kind = $1 AND state = 'current' ORDER BY lesson, slug`,
    [kind],
  );
  return rows.map(({ compiled }) => compiled);
}

async function entriesOf(client: pg.ClientBase): Promise<SearchEntry[]> {
  const courses = await currentOf<CompiledCourse>(client, 'course');
  const units = courses.flatMap((course) => course.units);
  const lessons = await currentOf<CompiledLesson>(client, 'lesson');
  const unitOf = ({ number }: CompiledLesson) =>
    units.find(({ sheets }) => sheets.includes(number))?.title ?? '';
  const glossaries = await currentOf<CompiledGlossary>(client, 'glossary');
  const language = glossaries[0]?.language ?? 'en';
  return [
    ...lessons.flatMap((lesson) => lessonEntries(lesson, unitOf(lesson))),
    ...gatherTerms(glossaries, lessons).map((term) => termEntry(term, language)),
    ...TABLES.map(tableEntry),
    ...SYMBOLS.map(symbolEntry),
  ];
}

const INSERT = `
INSERT INTO search_entries
  (id, kind, title, sheet, paragraph, heading, link, body, configuration, words)
SELECT id, kind, title, sheet, paragraph, heading, link, body, configuration,
  setweight(to_tsvector(configuration, normalize(names, NFKC)), 'A')
    || setweight(to_tsvector(configuration, normalize(intro, NFKC)), 'B')
    || setweight(
      to_tsvector(configuration, normalize(body, NFKC)),
      CASE kind WHEN 'sheet' THEN 'D' ELSE 'C' END::"char")
FROM jsonb_to_recordset($1::jsonb) AS entry
  (id integer, kind text, title text, sheet text, paragraph integer, heading text, link text,
   body text, names text, intro text, configuration regconfig)`;

/** Characters that mark a find inside a snippet; no text may hold them. */
const withoutMarks = (text: string) => text.replace(/[\ue000\ue001]/g, '');

/** Writes anew what can be found, from what is current, inside the open transaction. */
export async function indexContent(client: pg.ClientBase): Promise<void> {
  const entries = await entriesOf(client);
  const rows = entries.map(({ language, body, ...entry }, id) => ({
    ...{ ...entry, id, body: withoutMarks(body) },
    configuration: configurationOf(language),
  }));
  await client.query('DELETE FROM search_entries');
  await client.query(INSERT, [JSON.stringify(rows)]);
  const uses = countWords(entries.flatMap(({ names, intro, body }) => [names, intro, body]));
  await client.query('DELETE FROM search_words');
  await client.query(
    'INSERT INTO search_words (word, uses) SELECT key, value::integer FROM jsonb_each_text($1::jsonb)',
    [JSON.stringify(Object.fromEntries(uses))],
  );
}

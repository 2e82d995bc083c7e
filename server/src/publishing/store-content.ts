import type { Blueprint } from '@ferrule/assessments';
import { isDeepStrictEqual } from 'node:util';
import type pg from 'pg';
import type { CompiledContent, Revision } from './compile-content.ts';
import type { ProblemList } from './problem-list.ts';

/** What publishing did. */
export interface PublishingReport {
  readonly published: readonly string[];
  readonly unchanged: number;
}

interface StoredRevision {
  readonly hash: Buffer;
  readonly state: 'current' | 'superseded';
  readonly formatVersion: number;
}

const nameOf = ({ kind, slug, revision, lesson }: Revision) =>
  `${kind} ${kind === 'lesson' && lesson ? `${lesson} ` : ''}${slug}, revision ${revision}`;

async function findStored(client: pg.ClientBase, item: Revision): Promise<StoredRevision[]> {
  const { rows } = await client.query<StoredRevision>(
    `SELECT hash, state, format_version AS "formatVersion" FROM content_revisions
      WHERE kind = $1 AND slug = $2 AND language = $3 AND revision = $4`,
    [item.kind, item.slug, item.language, item.revision],
  );
  return rows;
}

/** Why a revision that is stored already may not be published; null when it is the same. */
function whyNot(item: Revision, stored: readonly StoredRevision[]): string | null {
  const { kind, slug, revision, hash } = item;
  if (stored.some((one) => !one.hash.equals(hash))) {
    return `${kind} "${slug}" was changed but is still revision ${revision}, which is published: give it the next revision letter`;
  }
  if (stored.length > 0 && stored.every(({ state }) => state === 'superseded')) {
    return `revision ${revision} of ${kind} "${slug}" has been superseded: give it a revision letter not used before`;
  }
  return null;
}

async function storeRevision(client: pg.ClientBase, item: Revision): Promise<void> {
  await client.query(
    `UPDATE content_revisions SET state = 'superseded'
      WHERE kind = $1 AND slug = $2 AND language = $3 AND state = 'current'`,
    [item.kind, item.slug, item.language],
  );
  await client.query(
    `INSERT INTO content_revisions
       (kind, slug, language, revision, source, hash, format_version, compiled, pool, subject, lesson)
     VALUES ($1, $2, $3, $4, $5, $6, $7, $8, $9, $10, $11)`,
    [
      item.kind,
      item.slug,
      item.language,
      item.revision,
      item.source,
      item.hash,
      item.formatVersion,
      JSON.stringify(item.compiled),
      item.pool,
      item.subject,
      item.lesson,
    ],
  );
}

type Scheme = Blueprint['scheme'];

async function findScheme(client: pg.ClientBase, scheme: Scheme): Promise<Scheme | null> {
  const { rows } = await client.query<Scheme>(
    `SELECT slug, revision, title, scope, limits, valid_years AS "validYears", zone
       FROM schemes WHERE slug = $1 AND revision = $2`,
    [scheme.slug, scheme.revision],
  );
  return rows[0] ?? null;
}

async function storeScheme(client: pg.ClientBase, scheme: Scheme): Promise<void> {
  const { slug, revision, title, scope, limits, validYears, zone } = scheme;
  await client.query(
    `INSERT INTO schemes (slug, revision, title, scope, limits, valid_years, zone)
     VALUES ($1, $2, $3, $4, $5, $6, $7)`,
    [slug, revision, title, JSON.stringify(scope), JSON.stringify(limits), validYears, zone],
  );
}

async function storeSchemes(
  client: pg.ClientBase,
  { schemes }: CompiledContent,
  problems: ProblemList,
): Promise<string[]> {
  const published: string[] = [];
  for (const { path, scheme } of schemes) {
    const stored = await findScheme(client, scheme);
    const { slug, revision, title, scope, limits, validYears, zone } = scheme;
    const wanted = { slug, revision, title, scope, limits, validYears, zone };
    if (stored && !isDeepStrictEqual({ ...stored }, wanted)) {
      problems.add(
        path,
        1,
        `scheme "${slug}" was changed but is still revision ${revision}, which is published: give the scheme the next revision letter`,
      );
    }
    if (stored) continue;
    await storeScheme(client, scheme);
    published.push(`scheme ${slug}, revision ${revision}`);
  }
  return published;
}

/** Stores what is new inside the open transaction; what is there already is only compared. */
export async function storeContent(
  client: pg.ClientBase,
  content: CompiledContent,
  problems: ProblemList,
): Promise<PublishingReport> {
  const published: string[] = [];
  for (const item of content.revisions) {
    const stored = await findStored(client, item);
    const reason = whyNot(item, stored);
    if (reason) problems.add(item.path, 1, reason);
    // The same sheet compiled to a newer form is stored again beside the old one.
    const isKept = stored.some(({ formatVersion }) => formatVersion === item.formatVersion);
    if (reason || isKept) continue;
    await storeRevision(client, item);
    published.push(nameOf(item));
  }
  const unchanged = content.revisions.length - published.length;
  return {
    published: [...published, ...(await storeSchemes(client, content, problems))],
    unchanged,
  };
}

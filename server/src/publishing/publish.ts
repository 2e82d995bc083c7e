import pg from 'pg';
import { indexContent } from '../search/index-content.ts';
import { compileContent, type CompiledContent } from './compile-content.ts';
import { ContentNotInOrder, ProblemList, type ContentNote } from './problem-list.ts';
import { readSources, type SourceFolders } from './read-sources.ts';
import { storeContent, type PublishingReport } from './store-content.ts';

const LOCK = 4_780_003;

async function inTransaction<T>(
  ownerUrl: string,
  work: (client: pg.ClientBase) => Promise<T>,
): Promise<T> {
  const client = new pg.Client({ connectionString: ownerUrl });
  await client.connect();
  try {
    await client.query('BEGIN');
    await client.query('SELECT pg_advisory_xact_lock($1)', [LOCK]);
    const result = await work(client);
    await client.query('COMMIT');
    return result;
  } catch (error) {
    await client.query('ROLLBACK');
    throw error;
  } finally {
    await client.end();
  }
}

/** Where publishing reads, and what of it a school may use. */
export interface PublishingOptions extends SourceFolders {
  /**
   * Whether paper questions are published too. Whoever reads the files knows them: they serve
   * demonstrations and tests, while a school keeps its own paper pool in its database only.
   */
  readonly withPaperPool: boolean;
}

export interface PublishingOutcome extends PublishingReport {
  /** How many paper questions were left out. */
  readonly leftOut: number;
  /** What does not keep content back, but its authors may want to know. */
  readonly notes: readonly ContentNote[];
}

/**
 * Publishes lessons, questions, courses, papers and schemes: all of it or nothing. What is
 * published already stays as it is.
 *
 * @param ownerUrl - the database with the owner's role.
 * @throws {ContentNotInOrder} naming file and line of everything that is wrong.
 */
export async function publish(
  ownerUrl: string,
  { withPaperPool, ...folders }: PublishingOptions,
): Promise<PublishingOutcome> {
  const problems = new ProblemList();
  const compiled = compileContent(await readSources(folders), problems, withPaperPool);
  refuseIfAny(problems);
  const content = withPaperPool ? compiled : withoutPaperPool(compiled);
  return inTransaction(ownerUrl, async (client) => {
    const report = await storeContent(client, content, problems);
    refuseIfAny(problems);
    await indexContent(client);
    const leftOut = compiled.revisions.length - content.revisions.length;
    return { ...report, leftOut, notes: problems.notes() };
  });
}

const withoutPaperPool = ({ revisions, schemes }: CompiledContent): CompiledContent => ({
  revisions: revisions.filter(({ pool }) => pool !== 'paper'),
  schemes,
});

function refuseIfAny(problems: ProblemList): void {
  if (!problems.isEmpty) throw new ContentNotInOrder(problems.sorted());
}

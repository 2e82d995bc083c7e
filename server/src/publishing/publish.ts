import pg from 'pg';
import { compileContent } from './compile-content.ts';
import { ContentNotInOrder, ProblemList } from './problem-list.ts';
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

/**
 * Publishes lessons, questions, courses, papers and schemes: all of it or nothing. What is
 * published already stays as it is.
 *
 * @param ownerUrl - the database with the owner's role.
 * @throws {ContentNotInOrder} naming file and line of everything that is wrong.
 */
export async function publish(ownerUrl: string, folders: SourceFolders): Promise<PublishingReport> {
  const problems = new ProblemList();
  const content = compileContent(await readSources(folders), problems);
  refuseIfAny(problems);
  return inTransaction(ownerUrl, async (client) => {
    const report = await storeContent(client, content, problems);
    refuseIfAny(problems);
    return report;
  });
}

function refuseIfAny(problems: ProblemList): void {
  if (!problems.isEmpty) throw new ContentNotInOrder(problems.sorted());
}

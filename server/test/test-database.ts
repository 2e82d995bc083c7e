import { randomBytes } from 'node:crypto';
import pg from 'pg';
import { migrate } from '../src/database/migrator.ts';
import { migrateJobs } from '../src/jobs/migrate-jobs.ts';

const TEMPLATE = 'ferrule_template';
const LOCK = 4_780_002;

export interface TestDatabase {
  readonly webUrl: string;
  readonly ownerUrl: string;
  drop(): Promise<void>;
}

function given(name: string): string {
  const value = process.env[name];
  if (!value) throw new Error(`${name} is missing: run the tests through jest's global setup.`);
  return value;
}

function onDatabase(url: string, database: string): string {
  const address = new URL(url);
  address.pathname = `/${database}`;
  return address.href;
}

async function asSuperuser<T>(work: (client: pg.Client) => Promise<T>): Promise<T> {
  const client = new pg.Client({ connectionString: given('FERRULE_TEST_SUPERUSER_URL') });
  await client.connect();
  try {
    return await work(client);
  } finally {
    await client.end();
  }
}

/** Migrates the template once; whoever comes second waits for it. */
async function ensureTemplate(client: pg.Client): Promise<void> {
  const { rows } = await client.query('SELECT 1 FROM pg_database WHERE datname = $1', [TEMPLATE]);
  if (rows.length > 0) return;
  const making = `${TEMPLATE}_making`;
  await client.query(`DROP DATABASE IF EXISTS ${making}`);
  await client.query(
    `CREATE DATABASE ${making} OWNER ferrule_owner TEMPLATE template0 ENCODING 'UTF8'`,
  );
  const ownerUrl = onDatabase(given('FERRULE_TEST_OWNER_URL'), making);
  await migrate(ownerUrl);
  await migrateJobs(ownerUrl);
  await client.query(`ALTER DATABASE ${making} RENAME TO ${TEMPLATE}`);
}

/** A database of one's own, cloned from the migrated template. */
export async function createTestDatabase(): Promise<TestDatabase> {
  const name = `ferrule_test_${randomBytes(6).toString('hex')}`;
  await asSuperuser(async (client) => {
    await client.query('SELECT pg_advisory_lock($1)', [LOCK]);
    await ensureTemplate(client);
    await client.query(`CREATE DATABASE ${name} OWNER ferrule_owner TEMPLATE ${TEMPLATE}`);
  });
  return {
    webUrl: onDatabase(given('FERRULE_TEST_WEB_URL'), name),
    ownerUrl: onDatabase(given('FERRULE_TEST_OWNER_URL'), name),
    drop: () =>
      asSuperuser(async (client) => {
        await client.query(`DROP DATABASE IF EXISTS ${name} WITH (FORCE)`);
      }),
  };
}

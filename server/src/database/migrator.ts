import { createHash } from 'node:crypto';
import pg from 'pg';
import { migrations, type Migration } from './migrations/index.ts';

const LOCK = 4_780_001;

/** A migration that was applied has other bytes now: history is never edited. */
export class MigrationChanged extends Error {
  constructor(name: string) {
    super(
      `Migration ${name} was applied with other contents; restore it and add a new one instead.`,
    );
    this.name = 'MigrationChanged';
  }
}

const checksum = (migration: Migration) => createHash('sha256').update(migration.sql).digest('hex');

async function applied(client: pg.Client): Promise<Map<string, string>> {
  await client.query(
    `CREATE TABLE IF NOT EXISTS schema_migrations (
       name text PRIMARY KEY, checksum text NOT NULL, applied_at timestamptz NOT NULL DEFAULT now())`,
  );
  const { rows } = await client.query<{ name: string; checksum: string }>(
    'SELECT name, checksum FROM schema_migrations',
  );
  return new Map(rows.map((row) => [row.name, row.checksum]));
}

async function apply(client: pg.Client, migration: Migration): Promise<void> {
  await client.query('BEGIN');
  try {
    await client.query(migration.sql);
    await client.query('INSERT INTO schema_migrations (name, checksum) VALUES ($1, $2)', [
      migration.name,
      checksum(migration),
    ]);
    await client.query('COMMIT');
  } catch (error) {
    await client.query('ROLLBACK');
    throw error;
  }
}

/**
 * Brings a database up to date, forwards only, one runner at a time.
 *
 * @param ownerUrl - address with the owner's role.
 * @returns names of the migrations applied now.
 * @throws {MigrationChanged} when an applied migration was edited.
 */
export async function migrate(
  ownerUrl: string,
  list: readonly Migration[] = migrations,
): Promise<string[]> {
  const client = new pg.Client({ connectionString: ownerUrl });
  await client.connect();
  try {
    await client.query('SELECT pg_advisory_lock($1)', [LOCK]);
    const done = await applied(client);
    const ran: string[] = [];
    for (const migration of list) {
      const before = done.get(migration.name);
      if (before !== undefined && before !== checksum(migration)) {
        throw new MigrationChanged(migration.name);
      }
      if (before !== undefined) continue;
      await apply(client, migration);
      ran.push(migration.name);
    }
    return ran;
  } finally {
    await client.end();
  }
}

/** Whether every migration of this build is applied. */
export function pendingMigrations(appliedNames: readonly string[]): string[] {
  return migrations.map(({ name }) => name).filter((name) => !appliedNames.includes(name));
}

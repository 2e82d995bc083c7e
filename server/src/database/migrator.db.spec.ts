import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import pg from 'pg';
import { createTestDatabase, type TestDatabase } from '../../test/test-database.ts';
import { migrate, MigrationChanged, pendingMigrations } from './migrator.ts';
import { migrations } from './migrations/index.ts';

let database: TestDatabase;
let owner: pg.Client;
let web: pg.Client;

async function connected(url: string): Promise<pg.Client> {
  const client = new pg.Client({ connectionString: url });
  await client.connect();
  return client;
}

beforeAll(async () => {
  database = await createTestDatabase();
  owner = await connected(database.ownerUrl);
  web = await connected(database.webUrl);
});
afterAll(async () => {
  await owner.end();
  await web.end();
  await database.drop();
});

describe('the schema', () => {
  it('has nothing left to apply once migrated', async () => {
    expect(await migrate(database.ownerUrl)).toEqual([]);
    const { rows } = await owner.query<{ name: string }>('SELECT name FROM schema_migrations');
    expect(pendingMigrations(rows.map(({ name }) => name))).toEqual([]);
  });

  it('refuses to go on when an applied migration was edited', async () => {
    const [first, ...rest] = migrations;
    const edited = [{ name: first?.name ?? '', sql: '-- other' }, ...rest];
    await expect(migrate(database.ownerUrl, edited)).rejects.toThrow(MigrationChanged);
  });

  it('applies a new migration once when two runners start together', async () => {
    const more = [...migrations, { name: '29990101T0000-try', sql: 'CREATE TABLE tried (id int)' }];
    const runs = await Promise.all([
      migrate(database.ownerUrl, more),
      migrate(database.ownerUrl, more),
    ]);
    expect(runs.flat()).toEqual(['29990101T0000-try']);
  });

  it('keeps nothing of a migration that fails', async () => {
    const failing = { name: '29990102T0000-fail', sql: 'CREATE TABLE half (id int); SELECT 1 / 0' };
    await expect(migrate(database.ownerUrl, [failing])).rejects.toThrow('division by zero');
    const { rows } = await owner.query("SELECT to_regclass('half') AS half");
    expect(rows).toEqual([{ half: null }]);
  });
});

describe("the server's role", () => {
  const refused = /permission denied|must be owner/;

  it('cannot change the schema', async () => {
    await expect(web.query('CREATE TABLE mine (id int)')).rejects.toThrow(refused);
    await expect(web.query('DROP TABLE accounts')).rejects.toThrow(refused);
  });

  it.each([
    'security_events',
    'sitting_answers',
    'sitting_results',
    'sitting_items',
    'decisions',
    'certificates',
    'certificate_files',
    'certificate_events',
    'item_looks',
    'content_revisions',
    'schemes',
  ])('cannot change or remove rows of %s', async (table) => {
    await expect(web.query(`DELETE FROM ${table}`)).rejects.toThrow(refused);
    const { rows } = await owner.query<{ column_name: string }>(
      "SELECT column_name FROM information_schema.columns WHERE table_name = $1 AND is_identity = 'NO'",
      [table],
    );
    const column = rows[0]?.column_name ?? '';
    await expect(web.query(`UPDATE ${table} SET ${column} = ${column}`)).rejects.toThrow(refused);
  });

  it('is no superuser and passes no row security by', async () => {
    const { rows } = await web.query(
      'SELECT rolsuper, rolbypassrls, rolcreatedb, rolcreaterole FROM pg_roles WHERE rolname = current_user',
    );
    expect(rows).toEqual([
      { rolsuper: false, rolbypassrls: false, rolcreatedb: false, rolcreaterole: false },
    ]);
  });
});

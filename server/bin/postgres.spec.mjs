import { describe, expect, it } from '@jest/globals';
import { findPostgres, runSql } from './steps/postgres-programs.mjs';

const ownerUrl = process.env.FERRULE_TEST_OWNER_URL;
const webUrl = process.env.FERRULE_TEST_WEB_URL;

describe('the private cluster', () => {
  it('lets the web role read and write rows but never change tables', async () => {
    const programs = await findPostgres();
    await runSql(programs, {
      url: ownerUrl,
      sql: `CREATE TABLE notes (text text); GRANT SELECT, INSERT ON notes TO ferrule_web;`,
    });
    const asWeb = (sql) => runSql(programs, { url: webUrl, sql });

    expect(await asWeb(`INSERT INTO notes VALUES ('kept'); SELECT text FROM notes;`)).toBe('kept');
    await expect(asWeb('CREATE TABLE mine (n int);')).rejects.toThrow(/permission denied/);
    await expect(asWeb('CREATE SCHEMA mine;')).rejects.toThrow(/permission denied/);
    await expect(asWeb('CREATE TEMPORARY TABLE mine (n int);')).rejects.toThrow(
      /permission denied/,
    );
    await expect(asWeb('DROP TABLE notes;')).rejects.toThrow(/must be owner/);
    await expect(asWeb('DELETE FROM notes;')).rejects.toThrow(/permission denied/);
    await runSql(programs, { url: ownerUrl, sql: 'DROP TABLE notes;' });
  });

  it('gives neither role a way round the rules on rows', async () => {
    const programs = await findPostgres();
    const asked = `SELECT rolname, rolsuper, rolbypassrls, rolcreaterole, rolcreatedb FROM pg_roles
      WHERE rolname LIKE 'ferrule%' ORDER BY 1;`;
    expect(await runSql(programs, { url: webUrl, sql: asked })).toBe(
      'ferrule_owner|f|f|f|f\nferrule_web|f|f|f|f',
    );
  });

  it('refuses a wrong password and stays on loopback, away from the usual port', async () => {
    const programs = await findPostgres();
    const wrong = new URL(webUrl);
    wrong.password = 'wrong';
    await expect(runSql(programs, { url: wrong.href, sql: 'SELECT 1;' })).rejects.toThrow(
      /password authentication failed/,
    );
    const asked = `SELECT current_setting('listen_addresses') || ' ' || (current_setting('port') <> '5432');`;
    expect(await runSql(programs, { url: webUrl, sql: asked })).toBe('127.0.0.1 true');
  });
});

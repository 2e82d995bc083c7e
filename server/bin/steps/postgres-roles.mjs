import { runSql } from './postgres-programs.mjs';

const databaseName = 'ferrule';

const createRole = (name, password) => `
DO $$ BEGIN
  IF NOT EXISTS (SELECT FROM pg_roles WHERE rolname = '${name}') THEN CREATE ROLE ${name}; END IF;
END $$;
ALTER ROLE ${name} LOGIN NOSUPERUSER NOCREATEDB NOCREATEROLE NOREPLICATION NOBYPASSRLS PASSWORD '${password}';`;

/** The owner migrates, the web role serves; neither may do the other's work. */
export async function ensureRolesAndDatabase(programs, { superuserUrl, passwords }) {
  const found = await runSql(programs, {
    url: superuserUrl,
    sql: `SET log_min_error_statement = panic;
${createRole('ferrule_owner', passwords.owner)}
${createRole('ferrule_web', passwords.web)}
SELECT 1 FROM pg_database WHERE datname = '${databaseName}';`,
  });
  if (found) return;
  await runSql(programs, {
    url: superuserUrl,
    sql: `CREATE DATABASE ${databaseName} OWNER ferrule_owner TEMPLATE template0 ENCODING 'UTF8'
  LC_COLLATE 'C.UTF-8' LC_CTYPE 'C.UTF-8';
REVOKE ALL ON DATABASE ${databaseName} FROM PUBLIC;
GRANT CONNECT ON DATABASE ${databaseName} TO ferrule_web;
\\connect ${databaseName}
ALTER SCHEMA public OWNER TO ferrule_owner;
REVOKE ALL ON SCHEMA public FROM PUBLIC;
GRANT USAGE ON SCHEMA public TO ferrule_web;`,
  });
}

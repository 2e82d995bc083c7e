import { existsSync, readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { installPackages } from './debian-packages.mjs';
import { runOrFail, StepFailed } from './processes.mjs';

const debianFolder = '/usr/lib/postgresql';

function newestProgramFolder() {
  const versions = existsSync(debianFolder) ? readdirSync(debianFolder) : [];
  return versions
    .filter((version) => existsSync(join(debianFolder, version, 'bin', 'initdb')))
    .sort((a, b) => Number(b) - Number(a))
    .map((version) => join(debianFolder, version, 'bin'))[0];
}

/** The folder of the newest PostgreSQL programs, installing Debian's package when there are none. */
export async function findPostgres(report) {
  const found = newestProgramFolder();
  if (found) return found;
  await installPackages(['postgresql'], report);
  const installed = newestProgramFolder();
  if (!installed) throw new StepFailed(`PostgreSQL was installed but not under ${debianFolder}.`);
  return installed;
}

/** PostgreSQL refuses to run as root, so root hands it to the account Debian made for it. */
export function postgresAccount() {
  if (process.getuid() !== 0) return undefined;
  const line = readFileSync('/etc/passwd', 'utf8')
    .split('\n')
    .find((entry) => entry.startsWith('postgres:'));
  if (!line) {
    throw new StepFailed(
      'PostgreSQL does not run as root and there is no "postgres" account. Run this as an ordinary user.',
    );
  }
  const [, , uid, gid] = line.split(':');
  return { uid: Number(uid), gid: Number(gid) };
}

/** Runs psql with SQL on its standard input, so that no password shows in a process list. */
export async function runSql(programs, { url, sql }) {
  const { hostname, port, username, password, pathname } = new URL(url);
  const env = {
    PATH: process.env.PATH,
    PGHOST: hostname,
    PGPORT: port,
    PGUSER: username,
    PGPASSWORD: password,
    PGDATABASE: pathname.slice(1),
    PGCONNECT_TIMEOUT: '10',
  };
  const args = ['-X', '-q', '-t', '-A', '-v', 'ON_ERROR_STOP=1', '-f', '-'];
  const { stdout } = await runOrFail(join(programs, 'psql'), args, { env, cwd: '/', input: sql });
  return stdout.trim();
}

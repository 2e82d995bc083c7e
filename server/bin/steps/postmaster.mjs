import {
  chmodSync,
  chownSync,
  existsSync,
  mkdirSync,
  readFileSync,
  renameSync,
  rmSync,
  statSync,
} from 'node:fs';
import { join } from 'node:path';
import { freePort } from './ports.mjs';
import { writePrivate } from './private-files.mjs';
import { isRunning, pause, run, runOrFail, StepFailed } from './processes.mjs';

const startAttempts = 4;
const endSeconds = 10;
const largestLogBytes = 5_000_000;

export function makeClusterFolder(folder, account) {
  mkdirSync(folder, { recursive: true });
  chmodSync(folder, 0o700);
  if (account) chownSync(folder, account.uid, account.gid);
}

/**
 * Makes the cluster.
 *
 * Made under another name and renamed when complete: a half-made cluster is never taken for one.
 */
export async function initialiseCluster({ programs, account, clusterFolder, password, throwaway }) {
  const draft = join(clusterFolder, 'data.draft');
  const passwordFile = join(clusterFolder, 'password.draft');
  rmSync(draft, { recursive: true, force: true });
  writePrivate(passwordFile, `${password}\n`);
  if (account) chownSync(passwordFile, account.uid, account.gid);
  const args = ['-D', draft, '-U', 'postgres', '-A', 'scram-sha-256', `--pwfile=${passwordFile}`];
  const locale = [
    '-E',
    'UTF8',
    '--locale=C.UTF-8',
    '--no-instructions',
    ...(throwaway ? ['--no-sync'] : []),
  ];
  try {
    await runOrFail(join(programs, 'initdb'), [...args, ...locale], {
      ...account,
      cwd: '/',
      detached: true,
    });
  } finally {
    rmSync(passwordFile, { force: true });
  }
  renameSync(draft, join(clusterFolder, 'data'));
}

function serverSettings(port, throwaway) {
  const settings = {
    listen_addresses: '127.0.0.1',
    port,
    unix_socket_directories: '',
    timezone: 'UTC',
    password_encryption: 'scram-sha-256',
    max_connections: throwaway ? 200 : 100,
    fsync: throwaway ? 'off' : 'on',
    synchronous_commit: throwaway ? 'off' : 'on',
    full_page_writes: throwaway ? 'off' : 'on',
  };
  return Object.entries(settings)
    .map(([name, value]) => `-c ${name}='${value}'`)
    .join(' ');
}

/** The postmaster's number and port, when the one named in postmaster.pid is alive and ours. */
export function findPostmaster(dataFolder) {
  const pidFile = join(dataFolder, 'postmaster.pid');
  if (!existsSync(pidFile)) return undefined;
  const [pid, , , port] = readFileSync(pidFile, 'utf8').split('\n');
  if (isRunning(Number(pid), dataFolder)) return { pid: Number(pid), port: Number(port) };
  // Left by a crash: its number may belong to some other process by now.
  rmSync(pidFile, { force: true });
  return undefined;
}

/** Ends a server nobody answers for any more; SIGINT asks for a fast shutdown. */
export async function endPostmaster(dataFolder) {
  const found = findPostmaster(dataFolder);
  if (!found) return;
  process.kill(found.pid, 'SIGINT');
  const deadline = Date.now() + endSeconds * 1000;
  while (findPostmaster(dataFolder) && Date.now() < deadline) await pause(50);
}

export async function startPostmaster({
  programs,
  account,
  clusterFolder,
  dataFolder,
  throwaway,
  wantedPort,
}) {
  const running = findPostmaster(dataFolder);
  if (running) return running.port;
  const logFile = join(clusterFolder, 'log.txt');
  if (existsSync(logFile) && statSync(logFile).size > largestLogBytes) rmSync(logFile);
  let remembered = wantedPort;
  for (let attempt = 1; attempt <= startAttempts; attempt += 1) {
    const port = await freePort(remembered);
    const options = ['-o', serverSettings(port, throwaway), '-l', logFile, '-w', '-t', '60'];
    const { code } = await run(join(programs, 'pg_ctl'), ['start', '-D', dataFolder, ...options], {
      ...account,
      cwd: '/',
      detached: true,
      withoutPipes: true,
    });
    if (code === 0) return port;
    if (findPostmaster(dataFolder)) break;
    // Somebody may have taken the port between the look and the start.
    remembered = undefined;
  }
  const lastWords = existsSync(logFile) ? readFileSync(logFile, 'utf8').split('\n').slice(-12) : [];
  throw new StepFailed(`PostgreSQL did not start. Its log ends:\n${lastWords.join('\n')}`);
}

import { existsSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { fromRoot, root } from './paths.mjs';
import { readJson } from './private-files.mjs';
import { runOrFail } from './processes.mjs';

const isForOneSystem = (entry) => entry.optional || entry.os || entry.cpu || entry.libc;

/** Whether node_modules holds what the lock file names, by npm's own record of what it installed. */
export function areDependenciesCurrent(locked, installed) {
  if (!installed) return false;
  return Object.entries(locked.packages)
    .filter(([path, entry]) => path !== '' && !isForOneSystem(entry))
    .every(([path, { version }]) => {
      const found = installed.packages[path];
      return found !== undefined && found.version === version;
    });
}

/** npm as this very Node.js has it; `npm run` says where. */
function npmCommand() {
  const named = process.env.npm_execpath;
  if (named?.endsWith('.js')) return [process.execPath, named];
  const beside = join(dirname(process.execPath), 'npm');
  return [existsSync(beside) ? beside : 'npm'];
}

/** Installs the locked dependencies when they are missing or stale. */
export async function installDependencies({ report, signal }) {
  const locked = readJson(fromRoot('package-lock.json'));
  const installed = readJson(fromRoot('node_modules', '.package-lock.json'));
  if (areDependenciesCurrent(locked, installed)) return 'unchanged';
  report('npm ci --ignore-scripts; this takes a minute or two');
  const [command, ...args] = npmCommand();
  const options = ['ci', '--ignore-scripts', '--no-audit', '--no-fund'];
  await runOrFail(command, [...args, ...options], { cwd: root, signal });
  return 'installed';
}

import { accessSync, constants } from 'node:fs';
import { delimiter, join } from 'node:path';
import { pause, run, StepFailed } from './processes.mjs';

const listsLocked = /could not get lock|unable to lock|is another process using it/i;
const lockWaitSeconds = 180;

export function findProgram(name) {
  const folders = [...(process.env.PATH ?? '').split(delimiter), '/usr/bin', '/usr/local/bin'];
  return folders
    .filter(Boolean)
    .map((folder) => join(folder, name))
    .find(isExecutable);
}

function isExecutable(path) {
  try {
    accessSync(path, constants.X_OK);
    return true;
  } catch {
    return false;
  }
}

async function asAdministrator() {
  if (process.getuid?.() === 0) return [];
  const sudo = findProgram('sudo');
  if (sudo && (await run(sudo, ['-n', 'true'])).code === 0) return [sudo, '-n'];
  return undefined;
}

async function aptGet(administrator, args) {
  const environment = ['env', 'DEBIAN_FRONTEND=noninteractive', 'LC_ALL=C.UTF-8'];
  const lockWait = ['-o', `DPkg::Lock::Timeout=${lockWaitSeconds}`];
  const [command, ...rest] = [...administrator, ...environment, 'apt-get', ...lockWait, ...args];
  const deadline = Date.now() + lockWaitSeconds * 1000;
  for (;;) {
    const result = await run(command, rest, { cwd: '/', detached: true });
    if (result.code === 0) return;
    if (!listsLocked.test(result.stderr) || Date.now() > deadline) {
      throw new StepFailed(`apt-get ${args.join(' ')} failed:\n${result.stderr || result.stdout}`);
    }
    await pause(2000);
  }
}

/** Installs Debian packages, or stops saying exactly what to type. */
export async function installPackages(packages, report = () => {}) {
  const byHand = `Install it yourself, then start again:\n  sudo apt-get update && sudo apt-get install -y ${packages.join(' ')}`;
  const administrator = findProgram('apt-get') ? await asAdministrator() : undefined;
  if (!administrator) {
    throw new StepFailed(
      `Missing: ${packages.join(', ')}. Installing needs apt-get and root or passwordless sudo.\n${byHand}`,
    );
  }
  try {
    report(`apt-get update`);
    await aptGet(administrator, ['update']);
    report(`apt-get install ${packages.join(' ')}`);
    await aptGet(administrator, ['install', '-y', ...packages]);
  } catch (error) {
    throw new StepFailed(`${error.message}\n${byHand}`);
  }
}

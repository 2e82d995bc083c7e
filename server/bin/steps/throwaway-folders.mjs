import {
  chmodSync,
  mkdtempSync,
  readdirSync,
  readFileSync,
  rmSync,
  statSync,
  writeFileSync,
} from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { endPostmaster } from './postmaster.mjs';
import { isRunning } from './processes.mjs';

const prefix = 'ferrule-throwaway-';

/** A new folder that names its owner, so that a later run can tell when it was abandoned. */
export function makeThrowawayFolder() {
  const folder = mkdtempSync(join(tmpdir(), prefix));
  chmodSync(folder, 0o711);
  writeFileSync(join(folder, 'owner'), String(process.pid));
  return folder;
}

const readNumber = (path) => {
  try {
    return Number(readFileSync(path, 'utf8').split('\n')[0]);
  } catch {
    return Number.NaN;
  }
};

function isAbandoned(folder) {
  try {
    if (statSync(folder).uid !== process.getuid()) return false;
  } catch {
    return false;
  }
  const owner = readNumber(join(folder, 'owner'));
  return Number.isInteger(owner) && !isRunning(owner, '.mjs');
}

/** Ends and removes clusters whose owner was killed before it could. */
export async function sweepThrowawayFolders() {
  const folders = readdirSync(tmpdir())
    .filter((name) => name.startsWith(prefix))
    .map((name) => join(tmpdir(), name))
    .filter(isAbandoned);
  for (const folder of folders) {
    await endPostmaster(join(folder, 'postgres', 'data'));
    rmSync(folder, { recursive: true, force: true });
  }
}

import { rmSync } from 'node:fs';
import { join } from 'node:path';
import { readJson, writePrivateJson } from './private-files.mjs';
import { identify, isStillThere, pause, StepFailed } from './processes.mjs';

const stopSeconds = 12;

async function endLeftOver(service) {
  process.kill(service.pid, 'SIGTERM');
  const deadline = Date.now() + stopSeconds * 1000;
  while (isStillThere(service) && Date.now() < deadline) await pause(100);
  if (isStillThere(service)) process.kill(service.pid, 'SIGKILL');
}

/**
 * Claims the data folder for this program, so that two never share it; ends what an earlier
 * one left running when it was killed.
 */
export async function claimDataFolder(folder) {
  const path = join(folder, 'running.json');
  const earlier = readJson(path);
  if (earlier && isStillThere(earlier.owner)) {
    throw new StepFailed(
      `It is running already${earlier.address ? ` at ${earlier.address}` : ''} (process ${earlier.owner.pid}). Stop that one first.`,
    );
  }
  for (const service of earlier?.services ?? []) {
    if (isStillThere(service)) await endLeftOver(service);
  }
  const claim = { owner: identify(process.pid), services: [] };
  writePrivateJson(path, claim);
  return {
    note(service, address) {
      const found = identify(service.pid);
      if (found) claim.services.push(found);
      if (address) claim.address = address;
      writePrivateJson(path, claim);
    },
    release: () => rmSync(path, { force: true }),
  };
}

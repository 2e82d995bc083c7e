import { spawn } from 'node:child_process';
import { existsSync } from 'node:fs';
import { join } from 'node:path';
import { startCluster } from './postgres.mjs';
import { buildServer } from './steps/builds.mjs';
import { installDependencies } from './steps/dependencies.mjs';
import { createLifetime } from './steps/lifetime.mjs';
import { checkNodeVersion } from './steps/node-version.mjs';
import { fromRoot, makeDataFolder, root } from './steps/paths.mjs';
import { findPostmaster } from './steps/postmaster.mjs';
import { createProgress } from './steps/progress.mjs';
import { StepFailed } from './steps/processes.mjs';
import { claimDataFolder } from './steps/running.mjs';

const lifetime = createLifetime();

/** The demonstration's own database: as it runs, or started for as long as this takes. */
async function openDemonstration(report) {
  const folder = makeDataFolder();
  const dataFolder = join(folder, 'postgres', 'data');
  if (!existsSync(dataFolder)) {
    throw new StepFailed(
      'There is no demonstration here: run npm start first, or set DATABASE_URL to a database.',
    );
  }
  if (findPostmaster(dataFolder)) return startCluster({ folder, report });
  const claim = await claimDataFolder(folder);
  lifetime.onEnd(async () => claim.release());
  const cluster = await startCluster({ folder, report });
  lifetime.onEnd(cluster.stop);
  return cluster;
}

/** Resolves to the exit code: 1 when an attempt comes out otherwise than it was stored. */
function remark(databaseUrl) {
  const child = spawn(process.execPath, [fromRoot('server', 'dist', 'cli', 'remark.js')], {
    cwd: root,
    env: { ...process.env, DATABASE_URL: databaseUrl },
    stdio: 'inherit',
    signal: lifetime.signal,
  });
  return new Promise((resolve, reject) => {
    child.on('error', reject).on('exit', (code) => resolve(code ?? 1));
  });
}

async function main() {
  const { signal } = lifetime;
  const progress = createProgress();
  await progress.step('Node.js', async (report) => checkNodeVersion(report));
  await progress.step('Dependencies', (report) => installDependencies({ report, signal }));
  await progress.step('Server and libraries', () => buildServer(signal));
  if (process.env.DATABASE_URL) return remark(process.env.DATABASE_URL);
  const { webUrl } = await progress.step('PostgreSQL', openDemonstration);
  return remark(webUrl);
}

try {
  process.exitCode = await main();
} catch (error) {
  if (lifetime.signal.aborted) console.error('\nStopped before the end.');
  else console.error(`\n${error instanceof StepFailed ? error.message : error.stack}`);
  process.exitCode = 1;
}
await lifetime.end();
process.exit();

import { rmSync } from 'node:fs';
import { join } from 'node:path';
import { startCluster } from './postgres.mjs';
import { buildServer, buildSite } from './steps/builds.mjs';
import { startDemonstration } from './steps/demonstration.mjs';
import { installDependencies } from './steps/dependencies.mjs';
import { createLifetime } from './steps/lifetime.mjs';
import { checkNodeVersion } from './steps/node-version.mjs';
import { startOnOwnDatabase } from './steps/own-database.mjs';
import { makeDataFolder } from './steps/paths.mjs';
import { endPostmaster } from './steps/postmaster.mjs';
import { createProgress } from './steps/progress.mjs';
import { StepFailed } from './steps/processes.mjs';
import { checkRealSettings } from './steps/real-settings.mjs';
import { claimDataFolder } from './steps/running.mjs';
import { welcomeToDemonstration, welcomeToOwnDatabase } from './steps/welcome.mjs';

const began = Date.now();
const secondsTaken = () => ((Date.now() - began) / 1000).toFixed(1);
const progress = createProgress();
const lifetime = createLifetime();

// The keys and secrets stay: certificates issued before a fresh start still verify.
const ofOneDemonstration = [
  'postgres',
  'postgres.json',
  'passphrases.json',
  'prepared.json',
  'mail',
  'mail-log.txt',
  'server-log.txt',
];

function readArguments(args) {
  const unknown = args.find((argument) => argument !== '--fresh');
  if (unknown) throw new StepFailed(`Unknown: ${unknown}. Usage: npm start [-- --fresh]`);
  const isFresh = args.includes('--fresh');
  const isOwnDatabase = Boolean(process.env.DATABASE_URL);
  if (isFresh && isOwnDatabase) {
    throw new StepFailed('--fresh removes the demonstration; with DATABASE_URL set there is none.');
  }
  return { isFresh, isOwnDatabase };
}

async function prepareCode() {
  const { signal } = lifetime;
  await progress.step('Node.js', async (report) => checkNodeVersion(report));
  await progress.step('Dependencies', (report) => installDependencies({ report, signal }));
  signal.throwIfAborted();
  await progress.step('Server and libraries', () => buildServer(signal));
  signal.throwIfAborted();
  await progress.step('Site', () => buildSite(signal));
  signal.throwIfAborted();
}

async function openDemonstration(isFresh) {
  const folder = makeDataFolder();
  const claim = await claimDataFolder(folder);
  lifetime.onEnd(async () => claim.release());
  if (isFresh) {
    await progress.step('Removing the old demonstration', async () => {
      await endPostmaster(join(folder, 'postgres', 'data'));
      for (const name of ofOneDemonstration)
        rmSync(join(folder, name), { recursive: true, force: true });
      return 'keys kept';
    });
  }
  await prepareCode();
  const cluster = await progress.step('PostgreSQL', (report) => startCluster({ folder, report }));
  lifetime.onEnd(cluster.stop);
  lifetime.signal.throwIfAborted();
  const onService = (service) => claim.note(service);
  const school = await startDemonstration({ folder, cluster, progress, lifetime, onService });
  claim.note(school.services.at(-1), school.siteUrl);
  console.log(welcomeToDemonstration({ ...school, seconds: secondsTaken() }));
  return [...school.services, { name: 'database', hasEnded: cluster.hasEnded(lifetime.signal) }];
}

async function openOwnDatabase() {
  checkRealSettings(process.env);
  await prepareCode();
  const school = await startOnOwnDatabase({ progress, lifetime });
  console.log(welcomeToOwnDatabase({ ...school, seconds: secondsTaken() }));
  return school.services;
}

async function stayUntilEnd(services) {
  const ended = services.map((service) => service.hasEnded.then((how) => ({ service, how })));
  const first = await Promise.race([lifetime.whenAsked, ...ended]);
  if (!first) return console.log('\nStopping; the data is kept.');
  const { service, how } = first;
  const words = service.lastWords ? `\n${service.lastWords()}` : '';
  throw new StepFailed(
    `The ${service.name} stopped by itself (${how}). Stopping the rest.${words}`,
  );
}

async function main() {
  const { isFresh, isOwnDatabase } = readArguments(process.argv.slice(2));
  console.log(isOwnDatabase ? 'Ferrule, on your own database' : 'Ferrule, the demonstration');
  const services = await (isOwnDatabase ? openOwnDatabase() : openDemonstration(isFresh));
  await stayUntilEnd(services);
}

try {
  await main();
} catch (error) {
  if (lifetime.signal.aborted) console.log('\nStopped; what was there is kept.');
  else {
    console.error(`\n${error instanceof StepFailed ? error.message : error.stack}`);
    process.exitCode = 1;
  }
} finally {
  await lifetime.end();
}
process.exit();

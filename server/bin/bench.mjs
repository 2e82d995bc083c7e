import { buildServer, buildSite } from './steps/builds.mjs';
import { installDependencies } from './steps/dependencies.mjs';
import { createLifetime } from './steps/lifetime.mjs';
import { checkNodeVersion } from './steps/node-version.mjs';
import { createProgress } from './steps/progress.mjs';
import { StepFailed } from './steps/processes.mjs';

async function main(lifetime) {
  const { signal } = lifetime;
  const progress = createProgress();
  await progress.step('Node.js', async (report) => checkNodeVersion(report));
  await progress.step('Dependencies', (report) => installDependencies({ report, signal }));
  await progress.step('Server and libraries', () => buildServer(signal));
  await progress.step('Site', () => buildSite(signal));
  signal.throwIfAborted();
  // What it measures is there only now.
  const { measureAll } = await import('./bench/measure-all.mjs');
  const { drawTable, overBounds } = await import('./bench/table.mjs');
  const measured = await measureAll({ lifetime, progress });
  console.log(`\n${drawTable(measured)}`);
  const over = overBounds(measured);
  if (over.length > 0) throw new StepFailed(`Over its bound: ${over.join('; ')}.`);
}

function reasonOf(error) {
  if (lifetime.signal.aborted) return 'Stopped before the end.';
  if (error.name === 'TimeoutError') return 'Measuring took too long; try on a calmer machine.';
  return error instanceof StepFailed ? error.message : error.stack;
}

const lifetime = createLifetime();
try {
  await main(lifetime);
} catch (error) {
  console.error(`\n${reasonOf(error)}`);
  process.exitCode = 1;
}
await lifetime.end();
process.exit();

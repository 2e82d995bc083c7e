import { rmSync } from 'node:fs';
import { scratchFolder } from './checks/program.mjs';
import { runTasks } from './checks/schedule.mjs';
import { tasks } from './checks/tasks.mjs';
import { installTestPrograms } from './checks/test-programs.mjs';
import { installDependencies } from './steps/dependencies.mjs';
import { createLifetime } from './steps/lifetime.mjs';
import { checkNodeVersion } from './steps/node-version.mjs';
import { createProgress } from './steps/progress.mjs';
import { StepFailed } from './steps/processes.mjs';

const stagesOf = {
  check: ['check', 'build'],
  pure: ['pure'],
  db: ['db'],
  page: ['page', 'site'],
  e2e: ['build', 'site', 'e2e'],
};
const heartbeatMilliseconds = 30_000;
const slowestShown = 5;

function chooseTasks(args) {
  if (args.length === 0) return tasks;
  const [option, stage] = args;
  if (option === '--only' && stagesOf[stage] && args.length === 2) {
    return tasks.filter((task) => stagesOf[stage].includes(task.stage));
  }
  const stages = Object.keys(stagesOf).join('|');
  throw new StepFailed(`Unknown: ${args.join(' ')}. Usage: npm test [-- --only ${stages}]`);
}

/** Says what starts and ends, and now and then what is still under way. */
function createReporter() {
  const underWay = new Map();
  const seconds = (since) => Math.round((Date.now() - since) / 1000);
  const heartbeat = setInterval(() => {
    const names = [...underWay].map(([title, since]) => `${title} (${seconds(since)} s)`);
    if (names.length > 0) console.log(`  ... under way: ${names.join(', ')}`);
  }, heartbeatMilliseconds);
  heartbeat.unref();
  return ({ task, state, result }) => {
    if (state === 'started') return void underWay.set(task.title, Date.now());
    underWay.delete(task.title);
    const failed = countFailed(result);
    const counts =
      failed > 0 ? `${result.passed} passed, ${failed} FAILED` : `${result.passed} passed`;
    console.log(
      `  ${failed > 0 ? '-- ' : 'ok '} ${task.title}: ${counts} (${result.seconds.toFixed(1)} s)`,
    );
  };
}

const countFailed = ({ failures }) => failures.filter(({ isNote }) => !isNote).length;

function showFailures(results) {
  for (const { title, text } of results.flatMap(({ failures }) => failures)) {
    console.log(`\n${'-'.repeat(80)}\n${title}\n\n${text}`);
  }
}

function showSlowest(chosen, results) {
  const slowest = chosen
    .map(({ name, title }) => ({ title, seconds: results.get(name)?.seconds ?? 0 }))
    .sort((a, b) => b.seconds - a.seconds)
    .slice(0, slowestShown)
    .map(({ title, seconds }) => `${title} ${seconds.toFixed(0)} s`);
  console.log(`\nSlowest: ${slowest.join(', ')}`);
}

async function prepare(chosen, lifetime) {
  const progress = createProgress();
  const { signal } = lifetime;
  await progress.step('Node.js', async (report) => checkNodeVersion(report));
  await progress.step('Dependencies', (report) => installDependencies({ report, signal }));
  if (chosen.some(({ stage }) => !['check', 'build'].includes(stage))) {
    await progress.step('Programs from outside', (report) => installTestPrograms(report));
  }
}

async function main(lifetime) {
  const began = Date.now();
  const chosen = chooseTasks(process.argv.slice(2));
  await prepare(chosen, lifetime);
  const context = { signal: lifetime.signal };
  const results = await runTasks(chosen, { context, onChange: createReporter() });
  lifetime.signal.throwIfAborted();
  const all = [...results.values()];
  const passed = all.reduce((sum, result) => sum + result.passed, 0);
  const failed = all.reduce((sum, result) => sum + countFailed(result), 0);
  showFailures(all);
  showSlowest(chosen, results);
  console.log(`${((Date.now() - began) / 1000).toFixed(0)} s in all`);
  return { passed, failed };
}

const lifetime = createLifetime();
let outcome;
try {
  outcome = await main(lifetime);
} catch (error) {
  const why = lifetime.signal.aborted ? 'Stopped before the end.' : undefined;
  console.error(`\n${why ?? (error instanceof StepFailed ? error.message : error.stack)}`);
  outcome = { passed: 0, failed: 1 };
}
await lifetime.end();
rmSync(scratchFolder, { recursive: true, force: true });
console.log(`${outcome.passed} passed, ${outcome.failed} failed`);
process.exit(outcome.failed > 0 ? 1 : 0);

import { readdirSync, readFileSync } from 'node:fs';
import { readOptions } from './bank-audit/options.mjs';
import { breachLine, headings, rowOf } from './bank-audit/table.mjs';
import { buildServer } from './steps/builds.mjs';
import { installDependencies } from './steps/dependencies.mjs';
import { createLifetime } from './steps/lifetime.mjs';
import { checkNodeVersion } from './steps/node-version.mjs';
import { fromRoot } from './steps/paths.mjs';
import { StepFailed } from './steps/processes.mjs';
import { createProgress } from './steps/progress.mjs';

function readSheets(only) {
  const bank = fromRoot('assessments', 'bank');
  const files = readdirSync(bank, { recursive: true })
    .filter((path) => path.endsWith('.md') && !path.endsWith('README.md'))
    .filter((path) => only === null || path.endsWith(`/${only}.md`))
    .sort();
  if (files.length > 0) return files.map((path) => ({ path, source: sourceOf(bank, path) }));
  throw new StepFailed(`No sheet ${only} in assessments/bank; give the id as it stands in one.`);
}

const sourceOf = (bank, path) => readFileSync(`${bank}/${path}`, 'utf8');

/** Processor time: other programs must not make a question look slow. */
function clock() {
  const { user, system } = process.cpuUsage();
  return (user + system) / 1000;
}

async function audit({ only, draws }, signal) {
  // Built only now.
  const { auditQuestion, breachesOf, parseQuestion } = await import('@ferrule/assessments');
  const sheets = readSheets(only);
  const breaches = [];
  const place = (at) => `${at + 1}/${sheets.length}`.padStart(8);
  console.log(`\n${draws} draws of each question\n${''.padStart(8)} ${headings()}`);
  for (const [at, { path, source }] of sheets.entries()) {
    const question = parseQuestion(source, `assessments/bank/${path}`);
    const found = auditQuestion(question, { draws, clock });
    breaches.push(...breachesOf(found));
    console.log(`${place(at)} ${rowOf(found).replaceAll('\n', `\n${''.padStart(8)} `)}`);
    // Lets a signal to stop come through.
    await new Promise((resolve) => setImmediate(resolve));
    signal.throwIfAborted();
  }
  return { breaches, count: sheets.length };
}

async function main({ signal }) {
  const options = readOptions(process.argv.slice(2));
  const progress = createProgress();
  await progress.step('Node.js', async (report) => checkNodeVersion(report));
  await progress.step('Dependencies', (report) => installDependencies({ report, signal }));
  await progress.step('Server and libraries', () => buildServer(signal));
  const { breaches, count } = await audit(options, signal);
  console.log(`\n${count} questions, ${breaches.length} figures out of bounds`);
  for (const breach of breaches) console.error(`  ${breachLine(breach)}`);
  return breaches.length === 0 ? 0 : 1;
}

function reasonOf(error) {
  if (lifetime.signal.aborted) return 'Stopped before the end.';
  const isOwn = error instanceof StepFailed || error.name === 'SheetInvalid';
  return isOwn ? error.message : error.stack;
}

const lifetime = createLifetime();
try {
  process.exitCode = await main(lifetime);
} catch (error) {
  console.error(`\n${reasonOf(error)}`);
  process.exitCode = 1;
}
await lifetime.end();
process.exit();

import { readdirSync } from 'node:fs';
import { basename } from 'node:path';
import { readOptions } from './bank-audit/options.mjs';
import { auditSheets } from './bank-audit/pool.mjs';
import { breachLine, headings, rowOf } from './bank-audit/table.mjs';
import { buildServer } from './steps/builds.mjs';
import { installDependencies } from './steps/dependencies.mjs';
import { createLifetime } from './steps/lifetime.mjs';
import { checkNodeVersion } from './steps/node-version.mjs';
import { fromRoot } from './steps/paths.mjs';
import { StepFailed } from './steps/processes.mjs';
import { createProgress } from './steps/progress.mjs';

const bank = 'assessments/bank';
const heartbeatMilliseconds = 30_000;
const indent = ' '.repeat(9);

function findSheets(only) {
  const paths = readdirSync(fromRoot(bank), { recursive: true })
    .filter((path) => path.endsWith('.md') && path !== 'README.md')
    .filter((path) => only === null || basename(path) === `${only}.md`)
    .sort()
    .map((path) => `${bank}/${path}`);
  if (paths.length > 0) return paths;
  throw new StepFailed(`No sheet ${only} in ${bank}; give the id as it stands in one.`);
}

/** Prints each question as it is done and, now and then, what is still under way. */
function createTable(count) {
  const underWay = new Map();
  let done = 0;
  const heartbeat = setInterval(() => {
    const names = [...underWay].map(([path, since]) => {
      return `${basename(path, '.md')} (${Math.round((Date.now() - since) / 1000)} s)`;
    });
    console.log(`${indent}... under way: ${names.join(', ')}`);
  }, heartbeatMilliseconds);
  heartbeat.unref();
  return {
    onBegin: (path) => underWay.set(path, Date.now()),
    add(path, audit) {
      underWay.delete(path);
      done += 1;
      const place = `${done}/${count}`.padStart(indent.length - 1);
      console.log(`${place} ${rowOf(audit).replaceAll('\n', `\n${indent}`)}`);
    },
    end: () => clearInterval(heartbeat),
  };
}

async function auditBank({ only, draws }, signal) {
  const sheets = findSheets(only);
  const breaches = [];
  console.log(`\n${draws} draws of each question\n${indent}${headings()}`);
  const table = createTable(sheets.length);
  const onEnd = (path, found) => {
    breaches.push(...found.breaches);
    table.add(path, found.audit);
  };
  await auditSheets(sheets, { draws, signal, onBegin: table.onBegin, onEnd });
  table.end();
  return { breaches, count: sheets.length };
}

async function main({ signal }) {
  const options = readOptions(process.argv.slice(2));
  const progress = createProgress();
  await progress.step('Node.js', async (report) => checkNodeVersion(report));
  await progress.step('Dependencies', (report) => installDependencies({ report, signal }));
  await progress.step('Server and libraries', () => buildServer(signal));
  const { breaches, count } = await auditBank(options, signal);
  console.log(`\nQuestions: ${count}, figures out of bounds: ${breaches.length}`);
  for (const breach of breaches) console.error(`  ${breachLine(breach)}`);
  return breaches.length === 0 ? 0 : 1;
}

function reasonOf(error) {
  if (lifetime.signal.aborted) return 'Stopped before the end.';
  return error instanceof StepFailed ? error.message : error.stack;
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

import { join } from 'node:path';
import { startThrowawayCluster } from '../postgres.mjs';
import { buildEverything, buildSite } from '../steps/builds.mjs';
import { fromRoot } from '../steps/paths.mjs';
import { checkApiDrift } from './api-drift.mjs';
import { checkBudgets } from './budgets.mjs';
import { runEndToEnd } from './end-to-end.mjs';
import { runTool, scratchFolder, tool } from './program.mjs';
import { readCheck, readUnitReport } from './reports.mjs';

const limitSeconds = 300;
const workspaces = ['assessments', 'certificates', 'server', 'site'];

/** A tool that passes or fails as one test. */
const check = ({ script, args, ...task }) => ({
  stage: 'check',
  weight: 1,
  ...task,
  run: async ({ signal }) =>
    readCheck(await runTool(tool(script), args, { signal, limitSeconds }), task),
});

/** Work of our own that passes or fails as one test. */
const ownCheck = ({ work, ...task }) => ({
  stage: 'check',
  weight: 1,
  ...task,
  run: async ({ signal }) => readCheck(await work(signal), task),
});

const vitest = (workspace, stage) => ({
  name: `vitest ${workspace}`,
  title: `Tests of ${workspace}`,
  stage,
  weight: 1,
  run: async ({ signal }) => {
    const reportFile = join(scratchFolder, `${workspace}.json`);
    const reporters = ['--reporter=dot', '--reporter=json', `--outputFile.json=${reportFile}`];
    const args = ['run', '--maxWorkers=1', ...reporters];
    const cwd = fromRoot(workspace);
    const ended = await runTool(tool('vitest/vitest.mjs'), args, { signal, cwd, limitSeconds });
    return readUnitReport(reportFile, { ...ended, name: `Tests of ${workspace}` });
  },
});

async function runJest({ signal }) {
  const cluster = await startThrowawayCluster(() => {});
  const reportFile = join(scratchFolder, 'server.json');
  try {
    const args = ['--maxWorkers=2', '--json', `--outputFile=${reportFile}`, '--silent'];
    const ended = await runTool(tool('jest/bin/jest.js'), args, {
      signal,
      cwd: fromRoot('server'),
      limitSeconds,
      env: {
        NODE_OPTIONS: '--experimental-vm-modules --disable-warning=ExperimentalWarning',
        FERRULE_TEST_SUPERUSER_URL: cluster.superuserUrl,
        FERRULE_TEST_OWNER_URL: cluster.ownerUrl,
        FERRULE_TEST_WEB_URL: cluster.webUrl,
      },
    });
    return readUnitReport(reportFile, { ...ended, name: 'Tests of server' });
  } finally {
    await cluster.stop();
  }
}

async function buildAll(signal) {
  await buildEverything(signal);
  return { code: 0, said: '' };
}

async function typesOfTests(signal) {
  const said = [];
  for (const workspace of workspaces) {
    // Against the built libraries: their sources have settings of their own.
    const project = ['-p', `${workspace}/tsconfig.lint.json`, '--customConditions', 'null'];
    const record = fromRoot('node_modules', '.cache', 'ferrule', `${workspace}.tsbuildinfo`);
    const args = [...project, '--noEmit', '--incremental', '--tsBuildInfoFile', record];
    const ended = await runTool(tool('typescript/bin/tsc'), args, { signal, limitSeconds });
    if (ended.code !== 0) said.push(ended.said);
  }
  return { code: said.length, said: said.join('\n') };
}

async function siteBudgets(signal) {
  await buildSite(signal);
  return checkBudgets();
}

/** Every check in the order it runs; `needs` names what must have passed before. */
export const tasks = [
  check({
    name: 'format',
    title: 'Formatting',
    script: 'prettier/bin/prettier.cjs',
    args: ['--check', '--log-level=warn', '.'],
    remedy: 'Remedy: npm run format',
  }),
  check({
    name: 'lint',
    title: 'Lint',
    script: 'eslint/bin/eslint.js',
    args: ['.', '--max-warnings=0'],
  }),
  ownCheck({ name: 'build', title: 'Types and build', stage: 'build', work: buildAll }),
  ownCheck({
    name: 'types of tests',
    title: 'Types of the tests',
    needs: ['build'],
    work: typesOfTests,
  }),
  check({
    name: 'boundaries',
    title: 'Boundaries',
    script: 'dependency-cruiser/bin/dependency-cruise.mjs',
    args: ['--config', '.dependency-cruiser.cjs', '--output-type', 'err-long', ...workspaces],
  }),
  check({ name: 'unused', title: 'Unused code', script: 'knip/bin/knip.js', args: [] }),
  ownCheck({
    name: 'api',
    title: 'API drift',
    needs: ['build'],
    work: checkApiDrift,
    remedy: 'Remedy: npm run build && npm run api',
  }),
  vitest('assessments', 'pure'),
  vitest('certificates', 'pure'),
  { name: 'jest', title: 'Tests of server', stage: 'db', weight: 2, run: runJest },
  vitest('site', 'page'),
  ownCheck({ name: 'site', title: 'Site build and budgets', stage: 'site', work: siteBudgets }),
  {
    name: 'end to end',
    title: 'End-to-end tests',
    stage: 'e2e',
    weight: 2,
    needs: ['build', 'site'],
    run: runEndToEnd,
  },
];

import { afterAll, describe, expect, it } from '@jest/globals';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { readBrowserReport, readUnitReport } from './reports.mjs';
import { runTasks } from './schedule.mjs';

const folder = mkdtempSync(join(tmpdir(), 'ferrule-report-'));
afterAll(() => rmSync(folder, { recursive: true }));

function kept(report) {
  const path = join(folder, 'report.json');
  writeFileSync(path, JSON.stringify(report));
  return path;
}

const assertion = (fullName, status, failureMessages = []) => ({
  fullName,
  status,
  failureMessages,
});
const fileOf = (assertionResults, rest = {}) => ({
  name: '/x/a.spec.ts',
  status: 'passed',
  message: '',
  assertionResults,
  ...rest,
});
const readUnit = (files, exit = { code: 0, said: '' }) =>
  readUnitReport(kept({ testResults: files }), { ...exit, name: 'Tests' });

describe('counting a report of unit tests', () => {
  it('counts what passed', () => {
    const result = readUnit([fileOf([assertion('a', 'passed'), assertion('b', 'passed')])]);
    expect(result).toEqual({ passed: 2, failures: [] });
  });

  it('shows a failure whole, with where it is', () => {
    const { failures } = readUnit([fileOf([assertion('adds up', 'failed', ['1 is not 2'])])]);
    expect(failures).toEqual([
      { title: expect.stringMatching(/a\.spec\.ts > adds up/), text: '1 is not 2' },
    ]);
  });

  it.each([
    ['a skipped test', [fileOf([assertion('a', 'passed'), assertion('b', 'pending')])], 0],
    ['a file that did not load', [fileOf([], { status: 'failed', message: 'no such module' })], 1],
    ['no tests at all', [], 0],
    ['a runner that crashed after its tests', [fileOf([assertion('a', 'passed')])], 1],
  ])('counts %s as a failure', (_, files, code) => {
    expect(readUnit(files, { code, said: 'words' }).failures).toHaveLength(1);
  });

  it('counts a missing report as a failure and repeats what the runner said', () => {
    const missing = join(folder, 'none.json');
    const { failures } = readUnitReport(missing, {
      code: 134,
      said: 'out of memory',
      name: 'Tests',
    });
    expect(failures[0].text).toMatch(/out of memory/);
  });
});

describe('counting a report of browser tests', () => {
  const spec = (title, status, errors = []) => ({
    title,
    file: 'journey.spec.ts',
    tests: [{ status, projectName: '', results: [{ errors }] }],
  });

  it('finds tests in nested suites and takes flaky and skipped ones for failed', () => {
    const report = {
      suites: [
        {
          specs: [spec('signs in', 'expected')],
          suites: [
            { specs: [spec('sits', 'flaky', [{ message: 'once' }]), spec('checks', 'skipped')] },
          ],
        },
      ],
      errors: [],
    };
    const result = readBrowserReport(kept(report), { code: 0, said: '', name: 'Journeys' });
    expect(result.passed).toBe(1);
    expect(result.failures.map(({ title }) => title)).toEqual([
      'journey.spec.ts > sits',
      'journey.spec.ts > checks',
    ]);
  });
});

describe('running tasks', () => {
  const context = { signal: new AbortController().signal };

  it('runs at most two light ones at once and a heavy one alone', async () => {
    let load = 0;
    const seen = [];
    const task = (name, weight) => ({
      name,
      weight,
      run: async () => {
        load += weight;
        seen.push(load);
        await new Promise((resolve) => setTimeout(resolve, 5));
        load -= weight;
        return { passed: 1, failures: [] };
      },
    });
    const tasks = [task('a', 1), task('b', 1), task('c', 2), task('d', 1), task('e', 1)];
    const results = await runTasks(tasks, { context, onChange: () => {} });
    expect(results.size).toBe(5);
    expect(Math.max(...seen)).toBe(2);
  });

  it('does not run what needs a failed one, and counts both as failed', async () => {
    let wasRun = false;
    const tasks = [
      {
        name: 'build',
        title: 'Build',
        weight: 1,
        run: async () => {
          throw new Error('no');
        },
      },
      {
        name: 'use',
        title: 'Use',
        weight: 1,
        needs: ['build'],
        run: async () => {
          wasRun = true;
          return { passed: 1, failures: [] };
        },
      },
    ];
    const results = await runTasks(tasks, { context, onChange: () => {} });
    expect(wasRun).toBe(false);
    expect([...results.values()].map(({ failures }) => failures.length)).toEqual([1, 1]);
  });
});

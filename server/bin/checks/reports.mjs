import { relative } from 'node:path';
import { root } from '../steps/paths.mjs';
import { readJson } from '../steps/private-files.mjs';

const skippedText = 'It was skipped: a check that does not run proves nothing.';

const colours = /\u001b\[[0-9;]*m/g;

/** Without colours and without the runner's own part of a stack, which says nothing. */
const plain = (text) =>
  text
    .replaceAll(colours, '')
    .split('\n')
    .filter((line) => !/^\s+at .*node_modules/.test(line))
    .join('\n');

const failure = (title, text) => ({ title, text: plain(text) });

/** What a runner said when its own report is missing or does not explain its exit. */
function judge({ passed, failures, code, said, name }) {
  if (failures.length > 0) return { passed, failures };
  if (passed === 0) return { passed, failures: [failure(name, `It ran no tests.\n${said}`)] };
  if (code !== 0)
    return { passed, failures: [failure(name, `It ended with exit ${code}.\n${said}`)] };
  return { passed, failures };
}

function failuresOfFile(file) {
  const path = relative(root, file.name);
  const failed = file.assertionResults.filter(({ status }) => status !== 'passed');
  if (failed.length === 0 && file.status === 'failed') return [failure(path, file.message)];
  return failed.map(({ fullName, status, failureMessages }) =>
    failure(
      `${path} > ${fullName}`,
      status === 'failed' ? failureMessages.join('\n') : skippedText,
    ),
  );
}

/** Counts a report in the shape that Jest and Vitest share. */
export function readUnitReport(reportFile, { code, said, name }) {
  const files = readJson(reportFile)?.testResults ?? [];
  const assertions = files.flatMap(({ assertionResults }) => assertionResults);
  const passed = assertions.filter(({ status }) => status === 'passed').length;
  return judge({ passed, failures: files.flatMap(failuresOfFile), code, said, name });
}

function specsOf(suite) {
  return [...(suite.specs ?? []), ...(suite.suites ?? []).flatMap(specsOf)];
}

function failuresOfSpec(spec) {
  return spec.tests
    .filter(({ status }) => status !== 'expected')
    .map(({ status, projectName, results }) => {
      const words = results.flatMap(({ errors }) => errors.map(({ message }) => message));
      const text = status === 'skipped' ? skippedText : words.join('\n');
      return failure([spec.file, projectName, spec.title].filter(Boolean).join(' > '), text);
    });
}

/** Counts a report of the browser tests. */
export function readBrowserReport(reportFile, { code, said, name }) {
  const report = readJson(reportFile) ?? {};
  const specs = (report.suites ?? []).flatMap(specsOf);
  const passed = specs.flatMap(({ tests }) => tests).filter(({ status }) => status === 'expected');
  const failures = [
    ...specs.flatMap(failuresOfSpec),
    ...(report.errors ?? []).map(({ message }) => failure(name, message)),
  ];
  return judge({ passed: passed.length, failures, code, said, name });
}

/** A check that is one test: it passes or fails as a whole. */
export function readCheck({ code, said }, { title, remedy }) {
  if (code === 0) return { passed: 1, failures: [] };
  return { passed: 0, failures: [failure(title, remedy ? `${said}\n${remedy}` : said)] };
}

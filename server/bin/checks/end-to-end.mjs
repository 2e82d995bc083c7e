import { existsSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { startThrowawayCluster } from '../postgres.mjs';
import { startDemonstration } from '../steps/demonstration.mjs';
import { freePort } from '../steps/ports.mjs';
import { createProgress } from '../steps/progress.mjs';
import { passphrasesFile } from '../steps/secrets.mjs';
import { fromRoot } from '../steps/paths.mjs';
import { readBrowserReport } from './reports.mjs';
import { runTool, scratchFolder, tool } from './program.mjs';

const limitSeconds = 420;
const lastLines = 40;

const lastLinesOf = (path) =>
  existsSync(path)
    ? readFileSync(path, 'utf8').trimEnd().split('\n').slice(-lastLines).join('\n')
    : '';

function withServerLog(result, folder) {
  if (result.failures.length === 0) return result;
  const text = lastLinesOf(join(folder, 'server-log.txt'));
  const log = { title: 'The end of the log of the server they ran against', text, isNote: true };
  return { ...result, failures: [...result.failures, log] };
}

async function runBrowser({ cluster, demonstration, signal, reportFile }) {
  const env = {
    E2E_BASE_URL: demonstration.siteUrl,
    E2E_MAIL_URL: demonstration.mailUrl,
    E2E_PASSPHRASES_FILE: passphrasesFile(cluster.folder),
    E2E_OWNER_URL: cluster.ownerUrl,
    PLAYWRIGHT_JSON_OUTPUT_FILE: reportFile,
  };
  const args = ['test', '--reporter=json', '--retries=0'];
  return runTool(tool('@playwright/test/cli.js'), args, {
    signal,
    env,
    cwd: fromRoot('site'),
    limitSeconds,
  });
}

/** The journeys, in a real browser against a demonstration made for them alone. */
export async function runEndToEnd({ signal }) {
  const endings = [];
  const lifetime = { signal, onEnd: (ending) => endings.push(ending) };
  const silent = createProgress(() => {});
  const reportFile = join(scratchFolder, 'end-to-end.json');
  try {
    const cluster = await startThrowawayCluster(() => {});
    endings.push(cluster.stop);
    const demonstration = await startDemonstration({
      folder: cluster.folder,
      cluster,
      firstPort: await freePort(),
      progress: silent,
      lifetime,
      onService: () => {},
    });
    const ended = await runBrowser({ cluster, demonstration, signal, reportFile });
    const result = readBrowserReport(reportFile, { ...ended, name: 'End-to-end tests' });
    return withServerLog(result, cluster.folder);
  } finally {
    for (const ending of endings.reverse()) await ending();
  }
}

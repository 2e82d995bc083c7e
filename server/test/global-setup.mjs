import { spawn } from 'node:child_process';
import { createInterface } from 'node:readline';
import { fileURLToPath } from 'node:url';

/** Uses the cluster it is given, or starts a throwaway one for this run. */
export default async function globalSetup() {
  if (process.env.FERRULE_TEST_SUPERUSER_URL) return;
  const script = fileURLToPath(new URL('../bin/postgres.mjs', import.meta.url));
  const child = spawn(process.execPath, [script, '--throwaway'], {
    stdio: ['pipe', 'pipe', 'inherit'],
  });
  const lines = createInterface({ input: child.stdout });
  const { value } = await lines[Symbol.asyncIterator]().next();
  const urls = JSON.parse(value);
  process.env.FERRULE_TEST_SUPERUSER_URL = urls.superuserUrl;
  process.env.FERRULE_TEST_OWNER_URL = urls.ownerUrl;
  process.env.FERRULE_TEST_WEB_URL = urls.webUrl;
  globalThis.throwawayCluster = child;
}

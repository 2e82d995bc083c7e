import { join } from 'node:path';
import { askedPort, nextFreePort } from './ports.mjs';
import { fromRoot, makeDataFolder, root } from './paths.mjs';
import { runOrFail } from './processes.mjs';
import { startService } from './services.mjs';

const usualPort = 4780;

async function runCommand(name, { env, signal }) {
  const script = fromRoot('server', 'dist', 'cli', `${name}.js`);
  const { stdout } = await runOrFail(process.execPath, [script], { cwd: root, env, signal });
  return stdout.trim();
}

/**
 * Starts the server on a database of the school's own: nothing is seeded, nothing stands in
 * for a mail server, and the server never learns the owner's password.
 */
export async function startOnOwnDatabase({ progress, lifetime }) {
  const { signal } = lifetime;
  const port = String(askedPort() ?? (await nextFreePort(usualPort)));
  const env = {
    NODE_ENV: 'production',
    HOST: '127.0.0.1',
    SITE_FOLDER: fromRoot('site', 'dist'),
    ...process.env,
    PORT: port,
    DEMONSTRATION: '0',
    MAIL_SINK_URL: '',
  };
  const { MIGRATION_DATABASE_URL: _owner, ...serverEnv } = env;
  const last = (text) => text.split('\n').at(-1);
  await progress.step('Schema', async () => last(await runCommand('migrate', { env, signal })));
  await progress.step('Lessons and questions', async () =>
    last(await runCommand('publish', { env, signal })),
  );
  const link = await runCommand('administrator-link', { env, signal });
  const server = await progress.step('Server', () =>
    startService({
      name: 'server',
      script: fromRoot('server', 'dist', 'main.js'),
      env: serverEnv,
      logFile: join(makeDataFolder(), 'server-log.txt'),
      signal,
    }),
  );
  lifetime.onEnd(server.stop);
  return { siteUrl: env.PUBLIC_URL, localUrl: server.addresses[0], link, services: [server] };
}

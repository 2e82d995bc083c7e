import { existsSync, mkdirSync, readdirSync } from 'node:fs';
import { join } from 'node:path';
import { hashContent } from './builds.mjs';
import { readDemonstrationPeople } from './people.mjs';
import { fromRoot, root } from './paths.mjs';
import { askedPort, holdPort, nextFreePort } from './ports.mjs';
import { readJson, writePrivateJson } from './private-files.mjs';
import { runOrFail, StepFailed } from './processes.mjs';
import { ensurePassphrases, ensureSecrets, passphrasesFile } from './secrets.mjs';
import { startService } from './services.mjs';

const usualPort = 4780;
const freshHint =
  'If the data of this demonstration may go, npm start -- --fresh begins again without it.';

/** What any program of ours may know of the terminal it was started from. */
function plainEnvironment() {
  const names = ['PATH', 'HOME', 'LANG', 'TZ', 'TMPDIR'];
  return Object.fromEntries(
    names.filter((name) => process.env[name]).map((name) => [name, process.env[name]]),
  );
}

/** The wanted port or the next free one for the site, the mail page and the mail itself. */
async function choosePorts(folder, firstPort) {
  const path = join(folder, 'ports.json');
  const kept = readJson(path) ?? {};
  const site = await nextFreePort(askedPort() ?? kept.site ?? firstPort);
  const mailPage = await nextFreePort(Math.max(kept.mailPage ?? 0, site + 1));
  const mail = await nextFreePort(Math.max(kept.mail ?? 0, mailPage + 1));
  const ports = { site, mailPage, mail };
  writePrivateJson(path, ports);
  return ports;
}

function settings({ folder, cluster, ports }) {
  return {
    ...plainEnvironment(),
    NODE_ENV: 'production',
    DEMONSTRATION: '1',
    HOST: '127.0.0.1',
    PORT: String(ports.site),
    PUBLIC_URL: `http://127.0.0.1:${ports.site}`,
    DATABASE_URL: cluster.webUrl,
    ...ensureSecrets(folder),
    SMTP_URL: `smtp://127.0.0.1:${ports.mail}`,
    MAIL_FROM: 'Ferrule <school@harrow-quay.example>',
    MAIL_SINK_URL: `http://127.0.0.1:${ports.mailPage}`,
    KEYS_FOLDER: join(folder, 'keys'),
    SITE_FOLDER: fromRoot('site', 'dist'),
  };
}

const command = (name) => fromRoot('server', 'dist', 'cli', `${name}.js`);

async function runCommand(name, env, signal) {
  const { stdout } = await runOrFail(process.execPath, [command(name)], { cwd: root, env, signal });
  return stdout.trim().split('\n').at(-1);
}

/** Brings the database to what the code and the files in the checkout say, once for each change. */
async function prepareDatabase({ folder, env, progress, signal }) {
  const path = join(folder, 'prepared.json');
  const content = hashContent();
  const hasKeys = existsSync(env.KEYS_FOLDER) && readdirSync(env.KEYS_FOLDER).length > 0;
  if (hasKeys && readJson(path)?.content === content) {
    await progress.step('Schema, keys, lessons and school', () => 'unchanged');
    return;
  }
  const steps = [
    ['Schema', 'migrate'],
    ['Signing keys', 'create-keys'],
    ['Lessons and questions', 'publish'],
    ['Demonstration school', 'seed'],
  ];
  for (const [title, name] of steps) {
    await progress
      .step(title, () => runCommand(name, env, signal))
      .catch((error) => {
        throw new StepFailed(`${error.message}\n\n${freshHint}`);
      });
  }
  writePrivateJson(path, { content });
}

const sinkService = (folder, ports) => ({
  name: 'mail sink',
  script: fromRoot('server', 'fakes', 'mail', 'sink.mjs'),
  env: {
    ...plainEnvironment(),
    SINK_SMTP_PORT: String(ports.mail),
    SINK_PAGE_PORT: String(ports.mailPage),
    SINK_FOLDER: join(folder, 'mail'),
  },
  logFile: join(folder, 'mail-log.txt'),
});

const serverService = (folder, env) => ({
  name: 'server',
  script: fromRoot('server', 'dist', 'main.js'),
  env,
  logFile: join(folder, 'server-log.txt'),
});

/**
 * Prepares a database and starts the mail sink and the server on it.
 *
 * @param options - `onService` is told of each program that stays.
 */
export async function startDemonstration({
  folder,
  cluster,
  firstPort = usualPort,
  progress,
  lifetime,
  onService,
}) {
  const { signal } = lifetime;
  mkdirSync(join(folder, 'keys'), { recursive: true, mode: 0o700 });
  const ports = await choosePorts(folder, firstPort);
  const releaseSitePort = await holdPort(ports.site);
  lifetime.onEnd(releaseSitePort);
  const env = settings({ folder, cluster, ports });
  const { people, classToJoin } = await readDemonstrationPeople();
  const passphrases = ensurePassphrases(
    folder,
    people.map(({ email }) => email),
  );
  const ownerEnv = {
    ...env,
    MIGRATION_DATABASE_URL: cluster.ownerUrl,
    DEMO_PASSPHRASES_FILE: passphrasesFile(folder),
  };
  const start = async (title, service) => {
    signal.throwIfAborted();
    const started = await progress.step(title, () => startService({ ...service, signal }));
    lifetime.onEnd(started.stop);
    onService(started);
    return started;
  };
  const sink = await start('Mail sink', sinkService(folder, ports));
  await prepareDatabase({ folder, env: ownerEnv, progress, signal });
  await releaseSitePort();
  const server = await start('Server', serverService(folder, env));
  return {
    siteUrl: env.PUBLIC_URL,
    mailUrl: env.MAIL_SINK_URL,
    people: people.map((person) => ({ ...person, passphrase: passphrases[person.email] })),
    classToJoin,
    services: [sink, server],
  };
}

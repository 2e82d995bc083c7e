import { join } from 'node:path';
import pg from 'pg';
import { startThrowawayCluster } from '../postgres.mjs';
import { startDemonstration } from '../steps/demonstration.mjs';
import { fromRoot } from '../steps/paths.mjs';
import { freePort } from '../steps/ports.mjs';
import { writePrivateJson } from '../steps/private-files.mjs';
import { createProgress } from '../steps/progress.mjs';
import { startService } from '../steps/services.mjs';
import { asking, sendOrFail } from './http-load.mjs';
import { newAnswer, signInTrainees, startSitting } from './people.mjs';
import { measurePhonePages } from './phone-pages.mjs';
import { compare } from './rounds.mjs';
import { whileRecording } from './statements.mjs';

const rounds = 8;
const roundMilliseconds = 800;
const warmings = 40;
const mostTries = 6;
const mostLooks = 40;
/** Far from the recorded ones, so that no replayed answer meets one that was saved. */
const firstSequence = { recorded: 700_001, ours: 1_000_000, bare: 5_000_000 };

/** Statements asked side by side come in any order. */
const textsOf = ({ statements }) =>
  statements
    .map(({ text }) => text)
    .sort()
    .join(';\n');

async function ask(url, text, values) {
  const client = new pg.Client({ connectionString: url });
  await client.connect();
  try {
    return (await client.query(text, values)).rows;
  } finally {
    await client.end();
  }
}

/** The school's first mail would go out for a minute; it waits until all is measured. */
const holdBackJobs = (ownerUrl) =>
  ask(
    ownerUrl,
    "UPDATE jobs.job SET start_after = now() + interval '1 day' WHERE state IN ('created', 'retry')",
  );

/** A replayed answer the database passed over would make the bare side look quick. */
async function requireAllKept({ cluster }, { sent }) {
  for (const [first, last] of sent()) {
    const [{ kept }] = await ask(
      cluster.ownerUrl,
      'SELECT count(*)::int AS kept FROM sitting_answers WHERE sequence > $1 AND sequence <= $2',
      [first, last],
    );
    if (kept !== last - first) throw new Error(`${last - first} answers sent, ${kept} kept.`);
  }
}

/** Waits until the server asks nothing by itself. */
async function waitForQuiet(record) {
  for (let tries = 0; tries < mostLooks; tries += 1) {
    const { statements } = await record(async () => {});
    if (statements.length === 0) return;
  }
  throw new Error('The server does not come to rest.');
}

/** Records until two in turn are alike: then nothing is in it that happens only now and then. */
async function recordSteadily(record, newRequest) {
  let last;
  for (let tries = 0; tries < mostTries; tries += 1) {
    const request = newRequest(tries);
    const { answer, statements } = await record(() => sendOrFail(request));
    const found = { statements, answer: JSON.parse(answer.text), body: request.body ?? {} };
    if (last && textsOf(found) === textsOf(last)) return found;
    last = found;
  }
  throw new Error(`No two recordings are alike:\n${textsOf(last)}`);
}

const courseOf = ({ headers }, siteUrl) => ({ url: `${siteUrl}/api/course`, headers });
const savingOf = ({ headers, partUrl }, sequence) => ({
  ...{ url: partUrl, method: 'PUT', headers },
  body: newAnswer(sequence),
});

/** What the server asks of the database for each person's course page and saved answer. */
async function recordLanes({ cluster, siteUrl, trainees }) {
  return whileRecording(cluster, async (record) => {
    await waitForQuiet(record);
    const lanes = [];
    for (const trainee of trainees) {
      const course = await recordSteadily(record, () => courseOf(trainee, siteUrl));
      trainee.partUrl = await startSitting(siteUrl, trainee);
      const saving = await recordSteadily(record, (tries) =>
        savingOf(trainee, firstSequence.recorded + tries),
      );
      lanes.push({ course, saving });
    }
    return lanes;
  });
}

async function startBareServer({ cluster, lanes, lifetime }) {
  const recordings = join(cluster.folder, 'recordings.json');
  writePrivateJson(recordings, { lanes });
  const bare = await startService({
    name: 'bare server',
    script: fromRoot('server', 'bin', 'bench', 'bare-server.mjs'),
    env: { DATABASE_URL: cluster.webUrl, BENCH_RECORDINGS: recordings },
    logFile: join(cluster.folder, 'bare-log.txt'),
    signal: lifetime.signal,
  });
  lifetime.onEnd(bare.stop);
  return { pid: bare.pid, url: bare.addresses[0] };
}

async function startStack(lifetime) {
  const cluster = await startThrowawayCluster(() => {});
  lifetime.onEnd(cluster.stop);
  const demonstration = await startDemonstration({
    ...{ folder: cluster.folder, cluster, lifetime },
    firstPort: await freePort(),
    progress: createProgress(() => {}),
    onService: () => {},
  });
  const server = demonstration.services.find(({ name }) => name === 'server');
  return { cluster, demonstration, server: { pid: server.pid, url: demonstration.siteUrl } };
}

const countWords = ({ statements }) => `${statements.length} statements`;

function courseSides({ trainees, server, bare }) {
  const ours = trainees.map((trainee) => () => courseOf(trainee, server.url));
  const theirs = trainees.map((_, lane) => () => ({ url: `${bare.url}/course/${lane}` }));
  return { ours, theirs };
}

function savingSides({ trainees, bare }) {
  let oursNext = firstSequence.ours;
  let bareNext = firstSequence.bare;
  const ours = trainees.map((trainee) => () => savingOf(trainee, (oursNext += 1)));
  const theirs = trainees.map((_, lane) => () => ({
    ...{ url: `${bare.url}/saving/${lane}`, method: 'PUT' },
    body: newAnswer((bareNext += 1)),
  }));
  const sent = () => [
    [firstSequence.ours, oursNext],
    [firstSequence.bare, bareNext],
  ];
  return { ours, theirs, sent };
}

async function measureSides({ ours, theirs }, { server, bare, blocks, signal }) {
  const milliseconds = roundMilliseconds;
  for (const next of [...ours, ...theirs]) {
    for (let count = 0; count < warmings; count += 1) await sendOrFail(next());
  }
  return compare({
    ...{ rounds, signal },
    ours: asking({ lanes: ours, pid: server.pid, milliseconds, block: blocks[0] }),
    bare: asking({ lanes: theirs, pid: bare.pid, milliseconds, block: blocks[1] }),
  });
}

const rowsOf = (what, recording, { time, processor }) => [
  { what: `${what} (${countWords(recording)})`, ...time },
  { what: '  processor time of the Node.js process alone', ...processor },
];

async function pagesOf({ server, trainees: [{ headers }] }, { progress, signal }) {
  let pages;
  await progress.step('Pages on a phone', async () => {
    pages = await measurePhonePages({ siteUrl: server.url, headers, signal });
  });
  return pages;
}

/** Reading the course page and saving an answer against a bare handler running the same SQL. */
export async function measureServing({ lifetime, progress }) {
  const { signal } = lifetime;
  const stack = await progress.step('A demonstration to measure', async () => {
    const { cluster, demonstration, server } = await startStack(lifetime);
    const trainees = await signInTrainees(demonstration);
    await holdBackJobs(cluster.ownerUrl);
    const lanes = await recordLanes({ cluster, siteUrl: server.url, trainees });
    const bare = await startBareServer({ cluster, lanes, lifetime });
    return { cluster, trainees, lanes, server, bare };
  });
  const [{ course, saving }] = stack.lanes;
  const measured = async (title, sides, blocks) => {
    let figures;
    await progress.step(title, async () => {
      figures = await measureSides(sides, { ...stack, blocks, signal });
    });
    return figures;
  };
  const reading = await measured('Course page', courseSides(stack), [11, 12]);
  const saved = savingSides(stack);
  const keeping = await measured('Saving an answer', saved, [13, 14]);
  await requireAllKept(stack, saved);
  const pages = await pagesOf(stack, { progress, signal });
  const rows = [
    ...rowsOf('Reading the course page', course, reading),
    ...rowsOf('Saving an answer', saving, keeping),
  ];
  return { rows, pages };
}

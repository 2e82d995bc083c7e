import { readFileSync, statSync } from 'node:fs';
import { join } from 'node:path';
import pg from 'pg';
import { pause } from '../steps/processes.mjs';

const settleMilliseconds = 300;
/** What the server's pool for requests calls itself; the pool for jobs has another name. */
const application = 'ferrule';
const mark = '>>';
const entryStart = new RegExp(`^${mark}([^|]*)\\|`);
const settings = {
  log_line_prefix: `${mark}%a|`,
  log_statement: 'all',
  log_error_verbosity: 'default',
};

/** Log entries of the server's requests; further lines of an entry begin with a tab. */
function entriesIn(log) {
  const entries = [];
  for (const line of log.trimEnd().split('\n')) {
    const start = entryStart.exec(line);
    if (start) entries.push({ by: start[1], text: line.slice(start[0].length) });
    else if (entries.length > 0) entries.at(-1).text += `\n${line.replace(/^\t/, '')}`;
  }
  return entries.filter(({ by }) => by === application).map(({ text }) => text);
}

/** `$1 = 'it''s', $2 = NULL` as a list. */
function readParameters(text) {
  const found = text.matchAll(/\$\d+ = (?:'((?:[^']|'')*)'|NULL)/g);
  return [...found].map(([, value]) => value?.replaceAll("''", "'") ?? null);
}

/** The statements in what the database wrote, in order, with their parameters. */
export function readStatements(log) {
  const statements = [];
  for (const entry of entriesIn(log)) {
    const statement = /^LOG: {2}(?:statement|execute [^:]+): ([\s\S]*)$/.exec(entry);
    if (statement) statements.push({ text: statement[1], values: [] });
    const detail = /^DETAIL: {2}parameters: ([\s\S]*)$/.exec(entry);
    if (detail) statements.at(-1).values = readParameters(detail[1]);
  }
  return statements;
}

async function configure(superuserUrl, lines) {
  const client = new pg.Client({ connectionString: superuserUrl });
  await client.connect();
  try {
    for (const line of lines) await client.query(line);
    await client.query('SELECT pg_reload_conf()');
  } finally {
    await client.end();
  }
  await pause(settleMilliseconds);
}

/**
 * Has the database write down each statement while `work` records requests, and not after.
 *
 * @param work - is given `record(request)`, which resolves to the request's answer and its
 *   statements; one request at a time.
 */
export async function whileRecording(cluster, work) {
  const logFile = join(cluster.folder, 'postgres', 'log.txt');
  const record = async (request) => {
    await pause(settleMilliseconds);
    const start = statSync(logFile).size;
    const answer = await request();
    await pause(settleMilliseconds);
    const statements = readStatements(readFileSync(logFile).subarray(start).toString());
    return { answer, statements };
  };
  const on = Object.entries(settings).map(
    ([name, value]) => `ALTER SYSTEM SET ${name} = '${value}'`,
  );
  const off = Object.keys(settings).map((name) => `ALTER SYSTEM RESET ${name}`);
  await configure(cluster.superuserUrl, on);
  try {
    return await work(record);
  } finally {
    await configure(cluster.superuserUrl, off);
  }
}

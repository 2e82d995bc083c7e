import { createServer } from 'node:http';
import pg from 'pg';
import { readJson } from '../steps/private-files.mjs';

const { lanes } = readJson(process.env.BENCH_RECORDINGS);
const pool = new pg.Pool({
  connectionString: process.env.DATABASE_URL,
  max: 12,
  // As the server has it.
  options: '-c synchronous_commit=on',
});

async function readBody(request) {
  let text = '';
  for await (const piece of request.setEncoding('utf8')) text += piece;
  return text === '' ? {} : JSON.parse(text);
}

/** What must differ each time (a key used once, a sequence) comes from the request. */
function valuesFor(values, recorded, body) {
  return values.map((value) => {
    if (value === recorded.idempotencyKey) return body.idempotencyKey;
    return value === String(recorded.sequence) ? body.sequence : value;
  });
}

async function replay({ statements, body: recorded }, body) {
  const client = await pool.connect();
  try {
    for (const { text, values } of statements) {
      await (values.length === 0
        ? client.query(text)
        : client.query(text, valuesFor(values, recorded, body)));
    }
  } finally {
    client.release();
  }
}

async function answer(request, response) {
  const [, kind, lane] = request.url.split('/');
  const recording = lanes[Number(lane)][kind];
  await replay(recording, await readBody(request));
  const text = JSON.stringify(recording.answer);
  response.writeHead(200, {
    'content-type': 'application/json; charset=utf-8',
    'content-length': Buffer.byteLength(text),
  });
  response.end(text);
}

const server = createServer((request, response) => {
  answer(request, response).catch((error) => {
    console.error(error);
    response.writeHead(500).end();
  });
});
server.listen(0, '127.0.0.1', () => {
  console.log(`ready http://127.0.0.1:${server.address().port}`);
});

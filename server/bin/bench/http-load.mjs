import { Agent, request as httpRequest } from 'node:http';
import { readFileSync } from 'node:fs';
import { execFileSync } from 'node:child_process';

/** Below what the server allows one address in a minute; every round has addresses of its own. */
const mostRequests = 1000;
const ticksPerSecond = Number(execFileSync('getconf', ['CLK_TCK'], { encoding: 'utf8' }));

/** Sends a request and resolves to status, headers and text. */
function send({ url, method = 'GET', headers = {}, body, agent }) {
  const payload = body === undefined ? undefined : JSON.stringify(body);
  const described = payload && {
    'content-type': 'application/json',
    'content-length': Buffer.byteLength(payload),
  };
  return new Promise((resolve, reject) => {
    const options = { method, agent, headers: { ...headers, ...described } };
    const sent = httpRequest(url, options, (response) => {
      let text = '';
      response.setEncoding('utf8').on('data', (piece) => (text += piece));
      response.on('end', () =>
        resolve({ status: response.statusCode, headers: response.headers, text }),
      );
      response.on('error', reject);
    });
    sent.on('error', reject);
    sent.end(payload);
  });
}

/** As {@link send}, but anything except success is an error. */
export async function sendOrFail(request) {
  const answer = await send(request);
  if (answer.status < 300) return answer;
  throw new Error(
    `${request.method ?? 'GET'} ${request.url} gave ${answer.status}: ${answer.text}`,
  );
}

/** Milliseconds of processor a process has used so far. */
function processorMilliseconds(pid) {
  const text = readFileSync(`/proc/${pid}/stat`, 'utf8');
  const fields = text.slice(text.lastIndexOf(')') + 2).split(' ');
  return ((Number(fields[11]) + Number(fields[12])) * 1000) / ticksPerSecond;
}

async function keepAsking({ next, until, localAddress }) {
  const agent = new Agent({ keepAlive: true, maxSockets: 1, localAddress });
  let count = 0;
  try {
    while (performance.now() < until && count < mostRequests) {
      await sendOrFail({ ...next(), agent });
      count += 1;
    }
  } finally {
    agent.destroy();
  }
  return count;
}

/**
 * A side of a comparison: several people, each on one connection kept open, each asking again
 * as soon as answered.
 *
 * @param options - `lanes` give each person's next request; `block` sets the addresses apart.
 * @returns per request: `time`, as one of many people sees the server's pace, and `processor`.
 */
export function asking({ lanes, pid, milliseconds, block }) {
  return async (round) => {
    const before = processorMilliseconds(pid);
    const began = performance.now();
    const until = began + milliseconds;
    const counts = await Promise.all(
      lanes.map((next, lane) =>
        keepAsking({ next, until, localAddress: `127.${block}.${round + 1}.${lane + 1}` }),
      ),
    );
    const count = counts.reduce((sum, one) => sum + one, 0);
    const spent = processorMilliseconds(pid) - before;
    return { time: (performance.now() - began) / count, processor: spent / count };
  };
}

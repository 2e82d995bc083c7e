import { createServer } from 'node:net';
import { StepFailed } from './processes.mjs';

const postgresDefault = 5432;

function tryListen(port) {
  return new Promise((resolve) => {
    const probe = createServer();
    probe.once('error', () => resolve(undefined));
    probe.listen({ port, host: '127.0.0.1' }, () => {
      const found = probe.address().port;
      probe.close(() => resolve(found));
    });
  });
}

const isPortFree = async (port) => (await tryListen(port)) !== undefined;

/** The remembered port when nobody has it, otherwise any free one; never PostgreSQL's usual port. */
export async function freePort(remembered) {
  if (remembered && remembered !== postgresDefault && (await isPortFree(remembered))) {
    return remembered;
  }
  for (;;) {
    const port = await tryListen(0);
    if (port === undefined) throw new StepFailed('No free port on 127.0.0.1.');
    if (port !== postgresDefault) return port;
  }
}

/** The first free port from the wanted one upwards. */
export async function nextFreePort(wanted) {
  for (let port = wanted; port < wanted + 100; port += 1) {
    if (await isPortFree(port)) return port;
  }
  throw new StepFailed(`Ports ${wanted} to ${wanted + 99} on 127.0.0.1 are all taken.`);
}

/** Keeps a port for a server that starts later: between the look and the start others look too. */
export function holdPort(port) {
  return new Promise((resolve, reject) => {
    const holder = createServer((socket) => socket.destroy());
    holder.once('error', reject);
    holder.listen(port, '127.0.0.1', () => {
      resolve(() => new Promise((released) => holder.close(released)));
    });
  });
}

/** The port named in the environment, if any. */
export function askedPort() {
  const asked = process.env.PORT;
  if (!asked) return undefined;
  const port = Number(asked);
  if (Number.isInteger(port) && port > 0 && port < 65_436) return port;
  throw new StepFailed(`PORT is ${asked}; it must be a whole number from 1 to 65435.`);
}

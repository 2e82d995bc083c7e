import { spawn } from 'node:child_process';
import { createWriteStream, existsSync, readFileSync, rmSync, statSync } from 'node:fs';
import { createInterface } from 'node:readline';
import { root } from './paths.mjs';
import { StepFailed } from './processes.mjs';

const largestLogBytes = 5_000_000;
const readySeconds = 60;
const stopSeconds = 12;
const lastLines = 25;
const longestLine = 400;

const sizeOf = (path) => (existsSync(path) ? statSync(path).size : 0);

/** Appends to a log; its last words are those of this run alone. */
function openLog(path) {
  if (sizeOf(path) > largestLogBytes) rmSync(path);
  const start = sizeOf(path);
  const lastWords = () => {
    if (!existsSync(path)) return '';
    const lines = readFileSync(path).subarray(start).toString().trimEnd().split('\n');
    return lines
      .slice(-lastLines)
      .map((line) => line.slice(0, longestLine))
      .join('\n');
  };
  return { log: createWriteStream(path, { flags: 'a', mode: 0o600 }), lastWords };
}

function signalGroup(child, signal) {
  try {
    process.kill(-child.pid, signal);
  } catch {
    // It ended between the look and the signal.
  }
}

async function stopService(child, hasEnded) {
  if (child.exitCode !== null || child.signalCode !== null) return;
  signalGroup(child, 'SIGTERM');
  const impatience = setTimeout(() => signalGroup(child, 'SIGKILL'), stopSeconds * 1000);
  await hasEnded;
  clearTimeout(impatience);
}

function waitUntilReady({ name, child, hasEnded, lastWords, signal }) {
  return new Promise((resolve, reject) => {
    const fail = (what) => reject(new StepFailed(`The ${name} ${what}.\n${lastWords()}`));
    const tooLong = setTimeout(
      () => fail(`was not ready in ${readySeconds} s`),
      readySeconds * 1000,
    );
    createInterface({ input: child.stdout }).on('line', (line) => {
      if (!line.startsWith('ready ')) return;
      clearTimeout(tooLong);
      resolve(line.split(' ').slice(1));
    });
    signal.addEventListener('abort', () => fail('was stopped while starting'), { once: true });
    void hasEnded.then((how) => {
      clearTimeout(tooLong);
      fail(`stopped while starting (${how})`);
    });
  });
}

/**
 * Starts a program that stays: its words go to a log, and it is ready when it says so.
 *
 * It leads a process group of its own, so that Ctrl-C in the terminal reaches only this
 * program and the order of stopping stays ours.
 */
export async function startService({ name, script, env, logFile, signal }) {
  const child = spawn(process.execPath, [script], {
    cwd: root,
    env,
    detached: true,
    stdio: ['ignore', 'pipe', 'pipe'],
  });
  const { log, lastWords } = openLog(logFile);
  child.stdout.pipe(log, { end: false });
  child.stderr.pipe(log, { end: false });
  const hasEnded = new Promise((resolve) => {
    child.once('error', (error) => resolve(error.message));
    child.once('close', (code, endedBy) => {
      log.end(() => resolve(endedBy ? `signal ${endedBy}` : `exit ${code}`));
    });
  });
  const stop = () => stopService(child, hasEnded);
  try {
    const addresses = await waitUntilReady({ name, child, hasEnded, lastWords, signal });
    return { name, pid: child.pid, addresses, hasEnded, stop, lastWords };
  } catch (error) {
    await stop();
    throw error;
  }
}

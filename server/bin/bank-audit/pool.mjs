import { fork } from 'node:child_process';
import { availableParallelism } from 'node:os';
import { fileURLToPath } from 'node:url';
import { StepFailed } from '../steps/processes.mjs';

const worker = fileURLToPath(new URL('./worker.mjs', import.meta.url));

/** Audits sheets side by side, one process a processor; tells each as it begins and ends. */
export async function auditSheets(paths, { draws, signal, onBegin, onEnd }) {
  const waiting = [...paths];
  const failed = new AbortController();
  const end = AbortSignal.any([signal, failed.signal]);
  const workThrough = async () => {
    const child = fork(worker);
    end.addEventListener('abort', () => child.kill(), { once: true });
    try {
      for (let path = waiting.shift(); path; path = waiting.shift()) {
        onBegin(path);
        onEnd(path, await ask(child, { path, draws }));
        end.throwIfAborted();
      }
    } catch (error) {
      failed.abort();
      throw error;
    } finally {
      child.kill();
    }
  };
  const count = Math.min(availableParallelism(), paths.length);
  await Promise.all(Array.from({ length: count }, workThrough));
}

function ask(child, job) {
  return new Promise((resolve, reject) => {
    const settle = (act, value) => {
      child.removeAllListeners();
      act(value);
    };
    child.once('message', ({ failure, ...found }) => {
      if (failure) settle(reject, new StepFailed(failure));
      else settle(resolve, found);
    });
    child.once('exit', () =>
      settle(reject, new StepFailed(`The audit of ${job.path} ended early.`)),
    );
    child.once('error', (error) => settle(reject, error));
    child.send(job);
  });
}

import { StepFailed } from '../steps/processes.mjs';

const capacity = 2;

/**
 * Runs tasks in their order, as many at once as two processors carry; a task waits for those
 * it needs and, when one of them failed, is not run and counts as failed.
 *
 * @param onChange - told when a task starts and ends.
 */
export async function runTasks(tasks, { context, onChange }) {
  const results = new Map();
  const underWay = new Map();
  let load = 0;

  const hasResult = (name) => results.has(name) || !tasks.some((task) => task.name === name);
  const failedNeed = (task) =>
    (task.needs ?? []).find((name) => results.get(name)?.failures.length > 0);
  const begin = (task) => {
    load += task.weight;
    const began = Date.now();
    onChange({ task, state: 'started' });
    const work = attempt(task, context).then((outcome) => {
      const result = { ...outcome, seconds: (Date.now() - began) / 1000 };
      load -= task.weight;
      underWay.delete(task.name);
      results.set(task.name, result);
      onChange({ task, state: 'ended', result });
    });
    underWay.set(task.name, work);
  };

  const waiting = [...tasks];
  while (waiting.length > 0 || underWay.size > 0) {
    if (context.signal.aborted) waiting.length = 0;
    for (const task of [...waiting]) {
      if (!(task.needs ?? []).every(hasResult)) continue;
      // A heavy task keeps its turn: nothing behind it goes first.
      if (load + task.weight > capacity) break;
      waiting.splice(waiting.indexOf(task), 1);
      const need = failedNeed(task);
      if (need) results.set(task.name, notRun(task, need));
      else begin(task);
    }
    if (underWay.size > 0) await Promise.race(underWay.values());
  }
  return results;
}

async function attempt(task, context) {
  try {
    return await task.run(context);
  } catch (error) {
    return {
      passed: 0,
      failures: [
        { title: task.title, text: error instanceof StepFailed ? error.message : error.stack },
      ],
    };
  }
}

const notRun = (task, need) => ({
  passed: 0,
  seconds: 0,
  failures: [{ title: task.title, text: `It was not run because "${need}" failed.` }],
});

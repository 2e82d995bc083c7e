const signals = ['SIGINT', 'SIGTERM', 'SIGHUP'];

/** npm passes a signal to its shell only: when that is gone, nobody is there to stop us. */
function watchStarter(ask) {
  if (!process.env.npm_lifecycle_event) return;
  const starter = process.ppid;
  const watch = setInterval(() => {
    if (process.ppid !== starter) ask();
  }, 500);
  watch.unref();
}

/**
 * Everything that must be ended when this program ends, ended last first.
 *
 * A signal only asks for the end: the step under way finishes or is cut short, and whoever
 * called {@link createLifetime} then calls `end`, so that nothing is started behind its back.
 */
export function createLifetime() {
  const asked = new AbortController();
  const endings = [];
  const ask = () => asked.abort();
  for (const signal of signals) process.on(signal, ask);
  watchStarter(ask);
  return {
    signal: asked.signal,
    whenAsked: new Promise((resolve) => {
      asked.signal.addEventListener('abort', () => resolve(), { once: true });
    }),
    onEnd: (ending) => endings.push(ending),
    async end() {
      while (endings.length) {
        const ending = endings.pop();
        await Promise.resolve(ending()).catch((error) => console.error(error.message));
      }
    },
  };
}

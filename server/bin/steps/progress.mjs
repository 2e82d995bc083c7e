const slowAfterMilliseconds = 1500;
const longestDetail = 90;

const seconds = (since) => `${((Date.now() - since) / 1000).toFixed(1)} s`;

const shorten = (text) =>
  text.length > longestDetail ? `${text.slice(0, longestDetail - 4)} ...` : text;

/** Says each step, how it ended and how long it took; a slow one is announced before it is over. */
export function createProgress(write = (line) => console.log(line)) {
  const report = (text) => write(`      ${text}`);
  return {
    report,
    async step(title, work) {
      const began = Date.now();
      const announce = setTimeout(() => write(`  ... ${title}`), slowAfterMilliseconds);
      try {
        const outcome = await work(report);
        const detail = typeof outcome === 'string' ? `: ${shorten(outcome)}` : '';
        write(`  ok  ${title}${detail} (${seconds(began)})`);
        return outcome;
      } catch (error) {
        write(`  --  ${title} (${seconds(began)})`);
        throw error;
      } finally {
        clearTimeout(announce);
      }
    },
  };
}

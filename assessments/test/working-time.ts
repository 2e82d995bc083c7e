/** Processor time of the quickest of three runs, ms: a busy machine must not look like a slow sum. */
export function workingTimeMs(work: () => void): number {
  const times = Array.from({ length: 3 }, () => {
    const before = process.cpuUsage();
    work();
    const { user, system } = process.cpuUsage(before);
    return (user + system) / 1000;
  });
  return Math.min(...times);
}

export default async function globalTeardown() {
  const child = globalThis.throwawayCluster;
  if (!child) return;
  const gone = new Promise((resolve) => child.once('exit', resolve));
  child.stdin.end();
  await gone;
}

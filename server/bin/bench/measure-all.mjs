import { measureMarking } from './marking.mjs';
import { measureServing } from './serving.mjs';
import { measureSigning } from './signing.mjs';

const limitMilliseconds = 175_000;

/** Every comparison, one after the other, so that none disturbs another. */
export async function measureAll({ lifetime: { signal: asked, onEnd }, progress }) {
  const signal = AbortSignal.any([asked, AbortSignal.timeout(limitMilliseconds)]);
  const lifetime = { signal, onEnd };
  const rows = [];
  const measure = (title, work) =>
    progress.step(title, async () => {
      rows.push(...(await work()));
    });
  await measure('Marking', () => measureMarking(lifetime));
  await measure('Signing', () => measureSigning(lifetime));
  rows.push(...(await measureServing({ lifetime, progress })));
  return rows;
}

import { measureDay } from './alone.mjs';
import { measureGrowth } from './growth.mjs';
import { measureQuestions } from './questions.mjs';
import { measureServing } from './serving.mjs';
import { measureSigning } from './signing.mjs';

const limitMilliseconds = 320_000;

/** Every comparison, one after the other, so that none disturbs another. */
export async function measureAll({ lifetime: { signal: asked, onEnd }, progress }) {
  const signal = AbortSignal.any([asked, AbortSignal.timeout(limitMilliseconds)]);
  const lifetime = { signal, onEnd };
  const rows = [];
  const alone = [];
  const measure = (title, work) =>
    progress.step(title, async () => {
      rows.push(...(await work()));
    });
  await measure('Drawing and marking', async () => {
    const { rows: compared, rates } = await measureQuestions(lifetime);
    alone.push(...rates);
    return compared;
  });
  await measure('Growth with the parts', () => measureGrowth(lifetime));
  await progress.step('Charging model', async () => {
    alone.push(await measureDay());
  });
  await measure('Signing', () => measureSigning(lifetime));
  const { rows: served, pages } = await measureServing({ lifetime, progress });
  rows.push(...served);
  return { rows, alone, pages };
}

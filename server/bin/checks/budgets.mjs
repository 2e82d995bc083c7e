import { readFileSync } from 'node:fs';
import { gzipSync } from 'node:zlib';
import { fromRoot } from '../steps/paths.mjs';
import { readJson } from '../steps/private-files.mjs';

const budgets = { javascriptKb: 170, cssKb: 30 };
// The front page is what a stranger loads first.
const firstPage = 'src/routes/front.tsx';

function collect(manifest, key, seen = new Set()) {
  if (seen.has(key)) return seen;
  if (!manifest[key]) throw new Error(`The site's manifest does not name ${key}.`);
  seen.add(key);
  for (const imported of manifest[key].imports ?? []) collect(manifest, imported, seen);
  return seen;
}

const gzipKb = (file) => gzipSync(readFileSync(fromRoot('site', 'dist', file))).length / 1000;
const sumKb = (files) => [...new Set(files)].reduce((sum, file) => sum + gzipKb(file), 0);

/** What the first page loads, compressed: the entry, its page and all they import at once. */
function measureFirstLoad() {
  const manifest = readJson(fromRoot('site', 'dist', '.vite', 'manifest.json'));
  if (!manifest) throw new Error('The site was built without a manifest.');
  const entry = Object.keys(manifest).find((key) => manifest[key].isEntry);
  const keys = [...collect(manifest, firstPage, collect(manifest, entry))];
  return {
    javascriptKb: sumKb(keys.map((key) => manifest[key].file)),
    cssKb: sumKb(keys.flatMap((key) => manifest[key].css ?? [])),
  };
}

/** Compares it with the budget; every number is kB after gzip. */
export function checkBudgets() {
  const measured = measureFirstLoad();
  const lines = Object.entries(budgets).map(([name, most]) => {
    const kb = measured[name].toFixed(1);
    return { line: `${name}: ${kb} of ${most}`, isOver: measured[name] > most };
  });
  return {
    code: lines.some(({ isOver }) => isOver) ? 1 : 0,
    said: lines.map(({ line }) => line).join('\n'),
  };
}

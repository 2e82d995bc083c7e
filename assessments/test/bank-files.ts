import { readdirSync, readFileSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { type Compiled } from '../src/questions/compiled.ts';
import { parseQuestion } from '../src/questions/sheet.ts';

const BANK = fileURLToPath(new URL('../bank/', import.meta.url));

let opened: Compiled[] | undefined;

/** Every question sheet of the bank, read and checked once. */
export function openBank(): Compiled[] {
  return (opened ??= readBank());
}

function readBank(): Compiled[] {
  return readdirSync(BANK, { recursive: true, encoding: 'utf8' })
    .filter((path) => path.endsWith('.md') && path !== 'README.md')
    .sort()
    .map((path) => parseQuestion(readFileSync(BANK + path, 'utf8'), `bank/${path}`) as Compiled);
}

/** One sheet by its id. */
export function openSheetNamed(slug: string): Compiled {
  const found = openBank().find((question) => question.meta.slug === slug);
  if (!found) throw new Error(`No sheet ${slug} in the bank.`);
  return found;
}

/** A keyed hash's worth of hex, one for each number. */
export function seedNumber(number: number): string {
  const mixed = (Math.imul(number + 1, 0x9e3779b1) >>> 0).toString(16).padStart(8, '0');
  return mixed + number.toString(16).padStart(56, '0');
}

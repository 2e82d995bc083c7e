import { Liquid } from 'liquidjs';
import type { LetterTemplate, WrittenLetter } from './letter.ts';

const TAGS = ['if', 'elsif', 'else', 'unless'];
const FILTERS = ['default'];

/** Values and conditions only: no files, no loops, no tag or filter that is not listed here. */
function makeEngine(): Liquid {
  const engine = new Liquid({
    templates: {},
    ownPropertyOnly: true,
    strictVariables: true,
    lenientIf: true,
    strictFilters: true,
    parseLimit: 10_000,
    renderLimit: 1_000,
    memoryLimit: 1_000_000,
  });
  for (const name of Object.keys(engine.tags)) if (!TAGS.includes(name)) delete engine.tags[name];
  for (const name of Object.keys(engine.filters)) {
    if (!FILTERS.includes(name)) delete engine.filters[name];
  }
  return engine;
}

const engine = makeEngine();

/** One line: what could end a line, and so begin a header, becomes a space. */
export const oneLine = (text: string): string =>
  text.replaceAll(/[\p{Cc}\p{Zl}\p{Zp}]+/gu, ' ').trim();

const isFilled = (text: string) => text !== '';

type Put = (text: string) => string;

function writeTable(
  table: LetterTemplate['table'],
  values: Readonly<Record<string, string>>,
  put: Put,
): WrittenLetter['table'] {
  const lines = (table ? values[table.lines] : undefined) ?? '';
  if (!table || lines === '') return null;
  const rows = lines.split('\n').map((line) => {
    const [label = '', value = ''] = line.split('\t');
    return [oneLine(label), oneLine(value)] as const;
  });
  const [label, value] = table.total;
  return { title: put(table.title), rows, total: [put(label), put(value)] };
}

/**
 * Puts the values into the words of a letter.
 *
 * @throws {Error} when a value the letter needs is missing.
 */
export function writeLetter(
  template: LetterTemplate,
  values: Readonly<Record<string, string>>,
  school: string,
): WrittenLetter {
  const missing = template.needs.filter((name) => !(name in values));
  if (missing.length > 0) throw new Error(`The letter lacks ${missing.join(', ')}.`);
  const put: Put = (text) => oneLine(String(engine.parseAndRenderSync(text, values)));
  return {
    subject: put(template.subject),
    preview: put(template.preview),
    kicker: put(template.kicker),
    heading: put(template.heading),
    tone: template.tone,
    facts: template.facts
      .map(([label, value]) => [put(label), put(value)] as const)
      .filter(([, value]) => isFilled(value)),
    before: template.before.map(put).filter(isFilled),
    button: { label: put(template.button.label), url: put(template.button.url) },
    table: writeTable(template.table, values, put),
    after: template.after.map(put).filter(isFilled),
    reason: put(template.reason),
    school,
  };
}

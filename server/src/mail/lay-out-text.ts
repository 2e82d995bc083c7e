import type { WrittenLetter } from './letter.ts';

function columns(rows: ReadonlyArray<readonly [string, string]>): string[] {
  const labelWidth = Math.max(...rows.map(([label]) => [...label].length));
  return rows.map(([label, value]) => `${label.padEnd(labelWidth)}  ${value}`);
}

export const sender = (school: string): string =>
  school === ''
    ? 'Sent by Ferrule.'
    : `${school}, through Ferrule. Replies reach the school office.`;

/** The letter as plain text, with the same facts as the HTML. */
export function layOutText(letter: WrittenLetter): string {
  const facts = letter.facts.map(([label, value]) => `${label}: ${value}`);
  const table = letter.table
    ? [letter.table.title, ...columns([...letter.table.rows, letter.table.total])]
    : [];
  const blocks = [
    [letter.kicker, letter.heading],
    facts,
    ...letter.before.map((line) => [line]),
    [`${letter.button.label}: ${letter.button.url}`],
    table,
    ...letter.after.map((line) => [line]),
    ['-- ', letter.reason, sender(letter.school)],
  ];
  return `${blocks
    .filter((block) => block.length > 0)
    .map((block) => block.join('\n'))
    .join('\n\n')}\n`;
}

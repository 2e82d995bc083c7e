import { type Result } from './queries.ts';

/** "Sheet 3.4, paragraph 2", so that it can be quoted. */
export function sayPlace({ kind, sheet, paragraph }: Result): string {
  if (kind === 'table') return 'Table';
  if (kind === 'term') return 'Glossary';
  return [sheet && `Sheet ${sheet}`, paragraph !== null && `paragraph ${paragraph}`]
    .filter(Boolean)
    .join(', ');
}

/** The words around what was looked for, which is marked. */
export function Snippet({ snippet: { text, marks } }: Pick<Result, 'snippet'>) {
  const starts = [0, ...marks.map(({ to }) => to)];
  return starts.map((start, index) => {
    const mark = marks[index];
    return (
      <span key={start}>
        {text.slice(start, mark?.from)}
        {mark && <mark>{text.slice(mark.from, mark.to)}</mark>}
      </span>
    );
  });
}

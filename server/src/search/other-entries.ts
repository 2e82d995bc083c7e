import { termAnchor, type Term } from '../glossary/terms.ts';
import type { DrawingSymbol } from '../tables/symbols.ts';
import type { ReferenceTable } from '../tables/reference-table.ts';
import type { SearchEntry } from './search-entry.ts';

const nowhere = { sheet: null, paragraph: null, heading: null };

export const termEntry = ({ term, means, also, sheets }: Term, language: string): SearchEntry => ({
  ...nowhere,
  ...{ kind: 'term', title: term, sheet: sheets[0] ?? null, language },
  link: `/glossary#${termAnchor(term)}`,
  ...{ names: [term, ...also].join(' '), intro: '', body: means },
});

const TABLES_LANGUAGE = 'en';

/** A table is found by what it is for and by what heads its rows and columns. */
export const tableEntry = ({ slug, title, note, columns, rows }: ReferenceTable): SearchEntry => ({
  ...nowhere,
  ...{ kind: 'table', title, language: TABLES_LANGUAGE, link: `/tables#${slug}` },
  ...{ names: title, intro: note },
  body: [
    note,
    ...columns.map(({ label, unit }) => `${label} ${unit}`.trim()),
    ...rows.flatMap(({ cells }) => cells.filter((cell) => /\p{L}{2}/u.test(cell))),
  ].join(' '),
});

export const symbolEntry = ({ slug, name, looks, means }: DrawingSymbol): SearchEntry => ({
  ...nowhere,
  ...{ kind: 'table', title: `Symbol: ${name}`, language: TABLES_LANGUAGE },
  ...{ link: `/tables#symbol-${slug}`, names: name, intro: '', body: `${means} ${looks}` },
});

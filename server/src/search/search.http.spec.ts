import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import { createAccount } from '../../test/factories/account.ts';
import { goodFiles, lessonSheet, publishFiles } from '../../test/factories/content.ts';
import { signIn, stranger, type Caller } from '../../test/sign-in.ts';
import { createTestApp, type TestApp } from '../../test/test-app.ts';
import type { Found } from './search.schemas.ts';

const SECOND = 'lessons/hq-dc2/runs/02-the-pair.md';
const pair = { number: '1.2', slug: 'the-pair', title: 'The pair' };

const BODY = `The windlass draws ninety amperes.

## What the winch needs

Anchors are heavy; so are $U_\\text{max}$ and their chains.

| Chain | Mass |
| ----- | ---- |
| Long | Tremendous |

The bulkhead is *insulated* by a grommet.

:::margin{title="Rubber"}
Grommets perish.
:::
`;

let test: TestApp;
let trainee: Caller;
beforeAll(async () => {
  test = await createTestApp();
  await publishFiles(test, { ...goodFiles(), [SECOND]: lessonSheet({ ...pair, body: BODY }) });
  trainee = await signIn(test.app, (await createAccount(test.app)).id);
});
afterAll(() => test.close());

const search = async (q: string): Promise<Found> => {
  const { status, body } = await trainee.call('GET', `/api/search?q=${encodeURIComponent(q)}`);
  expect({ q, status }).toEqual({ q, status: 200 });
  return body as Found;
};
const links = async (q: string) => (await search(q)).results.map(({ link }) => link);
const marked = ({ results: [first] }: Found) =>
  first?.snippet.marks.map(({ from, to }) => first.snippet.text.slice(from, to));

describe('a search', () => {
  it('quotes the paragraph, its heading and its sheet, and marks the words', async () => {
    const found = await search('heavy anchor');
    expect(found).toMatchObject({ query: 'heavy anchor', corrected: null, more: false });
    expect(found.results).toEqual([
      {
        ...{ kind: 'paragraph', title: 'The pair', sheet: '1.2', paragraph: 2 },
        ...{ heading: 'What the winch needs', link: '/sheets/1.2#p2' },
        snippet: {
          text: 'Anchors are heavy; so are Umax and their chains. Chain Mass Long Tremendous',
          marks: [
            { from: 0, to: 7 },
            { from: 12, to: 17 },
          ],
        },
      },
    ]);
  });

  it('finds the beginning of the last word, tables, margins and terms', async () => {
    expect(await links('windl')).toEqual(['/sheets/1.2#p1']);
    expect(await links('tremendous')).toEqual(['/sheets/1.2#p2']);
    expect(await links('grommets perish')).toEqual(['/sheets/1.2#p3']);
    expect(await links('one way distance')).toContain('/glossary#run');
    expect(await links('blade bolt-down')).toContain('/tables#fuses');
    expect(await links('locked isolator')).toContain('/tables#symbol-isolator');
  });

  it('puts a sheet of that name before what mentions it', async () => {
    expect((await links('the pair'))[0]).toBe('/sheets/1.2');
    expect((await links('run'))[0]).toBe('/glossary#run');

    expect((await links('winch'))[0]).toBe('/sheets/1.2#p2');
  });

  it('reads past a mistyped word and says so', async () => {
    const found = await search('buklhead insulat');
    expect(found).toMatchObject({ corrected: 'bulkhead insulat' });
    expect(marked(found)).toEqual(['bulkhead', 'insulated']);
    expect((await search('windalss draws')).corrected).toBe('windlass draws');
  });

  it('settles for some of the words where no place has all', async () => {
    expect(await links('windlass grommet')).toEqual(
      expect.arrayContaining(['/sheets/1.2#p1', '/sheets/1.2#p3']),
    );
    expect(await search('qqqqqq zzzzzz')).toMatchObject({ results: [], corrected: null });
  });

  it('finds only what is current', async () => {
    const next = { ...pair, revision: 'B', body: 'The capstan draws ninety amperes.\n' };
    await publishFiles(test, { ...goodFiles(), [SECOND]: lessonSheet(next) });
    expect(await links('windlass')).toEqual([]);
    expect(await links('capstan')).toEqual(['/sheets/1.2#p1']);
  });

  it.each([
    "run' & !x | (y) <-> z:*",
    "'; DROP TABLE search_entries; --",
    ':* & | ! ( ) < > \\',
    'run:* <2> pair',
    '\ue000run\ue001',
    'the and of',
    '%%% ___ \\\\',
    'Ω µ ² ½ ﬁ 电 кабель 🔌',
    'a'.repeat(100),
    'a '.repeat(50),
    '-run "pair" or -x',
  ])('takes %j for words', async (q) => {
    const { results } = await search(q);
    for (const { snippet } of results) expect(snippet.text).not.toMatch(/[\ue000\ue001]/);
  });

  it.each<[string, number, string]>([
    ['nothing', 422, ''],
    ['an empty query', 422, '?q='],
    ['blanks', 422, '?q=%20%20'],
    ['too much', 422, `?q=${'a'.repeat(101)}`],
    ['a sign that no text may hold', 422, '?q=%00run'],
    ['two queries', 422, '?q=a&q=b'],
    ['what it does not know', 422, '?q=run&page=2'],
  ])('refuses %s', async (_what, status, query) => {
    expect((await trainee.call('GET', `/api/search${query}`)).status).toBe(status);
  });

  it('is for people who are signed in', async () => {
    expect((await stranger(test.app).call('GET', '/api/search?q=run')).status).toBe(401);
  });
});

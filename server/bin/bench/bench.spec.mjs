import { describe, expect, it } from '@jest/globals';
import { compare } from './rounds.mjs';
import { readStatements } from './statements.mjs';
import { overBounds } from './table.mjs';

const { signal } = new AbortController();

describe('comparing two sides', () => {
  it('lets each side go first in turn and leaves the warming rounds out', async () => {
    const turns = [];
    const side = (name, figures) => async (round) => {
      turns.push(name);
      return { time: figures[round] };
    };
    const { time } = await compare({
      rounds: 3,
      ours: side('ours', [900, 900, 2, 4, 9]),
      bare: side('bare', [1, 1, 1, 2, 3]),
      signal,
    });

    expect(turns.slice(0, 4)).toEqual(['ours', 'bare', 'bare', 'ours']);
    expect(time).toEqual({ ours: 4, bare: 2, ratio: 2, low: 2, high: 3 });
  });
});

describe('bounds', () => {
  it('name what is over them, and nothing that has none', () => {
    const rows = [
      { what: '  Marking', ratio: 0.51, bound: 0.5 },
      { what: 'Signing', ratio: 900 },
    ];
    const alone = [
      { what: 'A day', milliseconds: 19.9, bound: 20 },
      { what: 'Draws', perSecond: 5 },
    ];
    expect(overBounds({ rows, alone })).toEqual(['Marking']);
  });
});

describe('reading statements out of what the database wrote', () => {
  it('takes those of requests, with line breaks, quotes and nulls', () => {
    const log = [
      '>>ferrule|LOG:  statement: START TRANSACTION;',
      '>>ferrule-jobs|LOG:  execute <unnamed>: SELECT $1 FROM jobs.job',
      ">>ferrule-jobs|DETAIL:  parameters: $1 = '7'",
      '>>ferrule|LOG:  execute <unnamed>: SELECT $1,',
      '\t\t$2, $3',
      ">>ferrule|DETAIL:  parameters: $1 = 'it''s $2 = ''no''', $2 = NULL, $3 = 'two",
      "\tlines'",
      '>>|LOG:  received SIGHUP, reloading configuration files',
      '',
    ].join('\n');

    expect(readStatements(log)).toEqual([
      { text: 'START TRANSACTION;', values: [] },
      { text: 'SELECT $1,\n\t$2, $3', values: ["it's $2 = 'no'", null, 'two\nlines'] },
    ]);
  });
});

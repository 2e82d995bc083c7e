import { describe, expect, it } from 'vitest';
import { workingTimeMs } from '../../test/working-time.ts';
import { SheetInvalid } from '../sheets/errors.ts';
import { parseQuestion } from './sheet.ts';

const SHEET = `---
id: vd-test-run
title: A test run
revision: A
subject: VD
level: apply
pool: practice
lesson: "3.4"
profile: metric
language: en
author: Odile Marchetti
checked by: Ruaridh Nakamura
sources: [Definitions]
given:
  load: { is: Load, symbol: I, from: 8 A, to: 16 A, step: 1 A }
  path: { is: Resistance, symbol: R, value: 50 mΩ }
steps:
  fall: { symbol: U_d, unit: V, is: load * path }
ask:
  a: { find: fall, units: [V, mV], within: 1 %, marks: 2 }
slips:
  - { is: You divided., say: multiply, makes: { fall: path * load / 2 } }
---

A lamp draws {load}.

More about it.

## a

Find the drop.
`;

function issuesOf(source: string): { line: number; message: string }[] {
  try {
    parseQuestion(source, 'bank/test.md');
  } catch (error) {
    if (error instanceof SheetInvalid) return error.issues;
    throw error;
  }
  return [];
}

/** What is wrong after one change, with the line of the changed text. */
function afterChange(from: string, to: string): { line: number; message: string }[] {
  expect(SHEET).toContain(from);
  return issuesOf(SHEET.replace(from, to));
}

describe('a question sheet', () => {
  it('reads into its meta, lead, body and parts', () => {
    const question = parseQuestion(SHEET, 'bank/test.md');
    expect(question.meta).toEqual({
      slug: 'vd-test-run',
      title: 'A test run',
      revision: 'A',
      subject: 'VD',
      level: 'apply',
      pool: 'practice',
      lesson: '3.4',
      marks: 2,
      author: 'Odile Marchetti',
      checkedBy: 'Ruaridh Nakamura',
      sources: ['Definitions'],
      language: 'en',
    });
    expect(question).toMatchObject({ lead: 'A lamp draws {load}.', body: 'More about it.' });
  });

  it('is plain data: storing it as JSON loses nothing', () => {
    const question = parseQuestion(SHEET, 'bank/test.md');
    expect(JSON.parse(JSON.stringify(question))).toEqual(question);
  });

  it.each([
    ['title: A test run', 'titel: A test run', 1, 'titel'],
    ['revision: A', 'revision: a', 4, 'one capital letter'],
    ['subject: VD', 'subject: XX', 5, 'subject'],
    ['lesson: "3.4"', 'lesson: 3.4', 8, 'lesson'],
    ['sources: [Definitions]', 'sources: []', 13, 'sources'],
    ['step: 1 A', 'step: 3 A', 15, 'does not come out even'],
    ['step: 1 A', 'step: 1 V', 15, 'another kind'],
    ['value: 50 mΩ', 'value: 50 furlongs', 16, 'is not a unit of the table'],
    ['value: 50 mΩ', 'value: "1,234 mΩ"', 16, 'is not a figure'],
    ['load: { is', 'A: { is', 15, 'a name is letters and digits'],
    ['path: { is', 'tau: { is', 16, 'a unit, prefix or constant'],
    ['fall: { symbol', 'load: { symbol', 18, 'declared twice'],
    ['is: load * path', 'is: load * paht', 18, 'Name "paht" is not declared'],
    ['is: load * path', 'is: load / path', 18, 'does not come out in V'],
    ['is: load * path', 'is: load + path', 18, 'Units do not match'],
    ['is: load * path', 'is: "load * [1]"', 18, 'Expression holds "["'],
    ['find: fall', 'find: drop2', 20, 'No step drop2'],
    ['within: 1 %', 'wihtin: 1 %', 20, 'wihtin'],
    ['units: [V, mV]', 'units: [A]', 20, 'A does not fit fall'],
    ['units: [V, mV]', 'units: []', 20, 'list the units'],
    ['within: 1 %', 'within: 1 A', 20, 'does not fit within'],
    ['marks: 2 }', 'marks: 2, carry: never }', 20, 'needs the reason'],
    ['makes: { fall', 'makes: { path', 22, 'No part asks for path'],
    ['path * load / 2', 'path / load', 22, 'does not come out in V'],
    ['## a', '## b', 20, 'has no text'],
    ['{load}', '{path2}', 24, '{path2} names no shown value'],
    ['Find the drop.', 'Find {it}.', 29, '{it} names no shown value'],
  ])('with %j as %j names line %d', (...change) => {
    const [from, to, line, message] = change;
    const issues = afterChange(from, to);
    expect(issues.map((issue) => issue.message).join('\n')).toContain(message);
    expect(issues.map((issue) => issue.line)).toContain(line);
  });

  it('reports everything that is wrong at once, in the order of its lines', () => {
    const source = SHEET.replace('50 mΩ', '50 furlongs').replace('find: fall', 'find: nothing');
    const lines = issuesOf(source).map((issue) => issue.line);
    expect(lines.length).toBeGreaterThan(1);
    expect(lines).toEqual(lines.toSorted((a, b) => a - b));
    expect(() => parseQuestion(source, 'bank/test.md')).toThrow(/^bank\/test\.md:16: /);
  });

  it('refuses a sheet no draw of which can be kept, at the condition that rejects', () => {
    const source = SHEET.replace(
      'ask:',
      'require:\n  - load > path / path * load / 2\n  - load > 2 * load\nask:',
    );
    expect(issuesOf(source)).toEqual([
      {
        line: 21,
        message:
          'require › 1: 0 % of the drawn values meet the conditions, and 0 % this one alone; loosen it or narrow the given values.',
      },
    ]);
  });

  it('refuses a sheet that keeps fewer than one draw in ten', () => {
    const limit = 'limit: { is: Limit, value: 15.5 A, shown: false }\nsteps:';
    const wide = SHEET.replace('to: 16 A, step: 1 A', 'to: 16 A, step: 0.5 A');
    const source = wide
      .replace('steps:', `  ${limit}`)
      .replace('ask:', 'require:\n  - load > limit\nask:');
    expect(issuesOf(source)[0]).toMatchObject({ line: 21 });
    expect(issuesOf(source.replace('15.5 A', '10 A'))).toEqual([]);
  });

  it('refuses a sheet that cannot be worked on one value of its list', () => {
    const source = SHEET.replace('from: 8 A, to: 16 A, step: 1 A', 'one of: [8 A, 9 A, 10 A, 0 A]');
    const divided = source.replace('load * path', 'path * load * load / load');
    expect(issuesOf(divided)[0]?.message).toContain('Step fall comes to no finite number');
  });

  it.each([
    'load * path * 10 ^ 9999',
    'load * path * (9 ^ 9 ^ 9 ^ 9)',
    'load ^ 1e308 * path',
    'load ^ -9e99',
    'lοad * path',
    'load * pa\u200bth',
    'load * path × 2',
    '\u202eload * path',
    'load\u00a0* path',
    'load * path * １',
    'constructor',
    '__proto__ * path',
    'load * path * [1][0]',
    'load * path * (1:3)',
    'load * path + 0 * toString()',
  ])('refuses the hostile sum %j within 50 ms', (sum) => {
    const source = SHEET.replace('is: load * path', `is: ${JSON.stringify(sum)}`);
    let issues: unknown[] = [];
    expect(workingTimeMs(() => (issues = issuesOf(source)))).toBeLessThan(50);
    expect(issues).not.toEqual([]);
  });

  it('refuses a missing end of the front matter, broken YAML, doubled keys and aliases', () => {
    expect(issuesOf('no front matter')[0]?.message).toContain('begin with a line ---');
    expect(issuesOf(SHEET.replace('given:', 'given: [')).length).toBeGreaterThan(0);
    expect(issuesOf(SHEET.replace('level: apply', 'level: apply\nlevel: recall'))[0]).toEqual({
      line: 7,
      message: 'Map keys must be unique',
    });
    const aliased = SHEET.replace('is: Load,', 'is: &x Load,').replace('is: Resistance', 'is: *x');
    expect(issuesOf(aliased).length).toBeGreaterThan(0);
  });

  it('refuses a choice with no right option, two, or a wrong one without its reason', () => {
    const choice = (options: string): string =>
      SHEET.replace('marks: 2 }', `marks: 2 }\n  b: { choose: [${options}], marks: 1 }`) +
      '\n## b\n\nWhich?\n';
    const right = '{ is: yes, right: true }';
    expect(issuesOf(choice(`${right}, { is: no, say: because }`))).toEqual([]);
    expect(issuesOf(choice(`${right}, { is: no }`))[0]?.message).toContain('write why it is');
    const other = '{ is: surely, right: true }';
    expect(issuesOf(choice(`${right}, ${other}`))[0]?.message).toContain('2 options are right');
    expect(issuesOf(choice(`${right}, ${right}`))[0]?.message).toContain('stands there twice');
    expect(issuesOf(choice('{ is: a, say: x }, { is: b, say: x }'))[0]?.message).toContain(
      '0 options',
    );
  });
});

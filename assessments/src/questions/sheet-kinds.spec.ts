import { describe, expect, it } from 'vitest';
import { SheetInvalid } from '../sheets/errors.ts';
import { parseQuestion } from './sheet.ts';

const SHEET = `---
id: te-test-kinds
title: Every kind
revision: A
subject: TE
level: apply
pool: practice
lesson: "3.4"
read: What a crimp must hold
profile: awg
language: en
author: Odile Marchetti
checked by: Ruaridh Nakamura
sources: [Definitions]
tables:
  pull:
    caption: Least pull
    source: made up
    columns: { gauge: { is: Gauge, unit: AWG }, force: { is: Pull, unit: N } }
    rows: [[16, 67], [14, 133], [1/0, 900]]
given:
  size: { is: Gauge, symbol: n, column: pull.gauge }
  other: { is: Other, symbol: m, one of: [16, 14], unit: AWG }
steps:
  force: { symbol: F, unit: N, look up: { table: pull, column: force, where: gauge, is: size } }
ask:
  a: { find: force, units: [N], within: 1 %, marks: 2, read: The pull test }
  b:
    choose all:
      - { is: One, right: true }
      - { is: Two, say: not two }
    marks: 1
  c:
    order: { strip: Strip, insert: Insert, press: Press }
    misplaced:
      - { first: insert, then: strip, say: strip it first }
      - { first: press, then: strip, say: nothing to press }
    marks: 2
  d:
    match: { red: thin, blue: middle, yellow: thick }
    also: [none]
    mixed:
      - { is: red, with: thick, say: red is the thinnest }
      - { is: blue, with: none, say: blue is for something }
    marks: 2
slips:
  - { is: A row up., say: go down, makes: { force: { look up: { rows off: -1 } } } }
---

Lead.

## a

Pull?

## b

All?

## c

Order?

## d

Match?
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

describe('a sheet of tables and lists', () => {
  it('is plain data: storing it as JSON loses nothing', () => {
    const question = parseQuestion(SHEET, 'bank/test.md');
    expect(JSON.parse(JSON.stringify(question))).toEqual(question);
    expect(question).toMatchObject({ read: 'What a crimp must hold' });
  });

  it.each([
    // Tables.
    ['[16, 67], ', '[16], ', 20, 'A row of 1 cells under 2 columns'],
    ['[16, 67]', '[16, many]', 20, '"many" is not a figure'],
    ['[16, 67]', '[16, 67 A]', 20, '"67 A" is not in N'],
    ['rows: [[16, 67], [14, 133], [1/0, 900]]', 'rows: [[16, 67]]', 20, 'two rows at least'],
    ['gauge: { is: Gauge, unit: AWG }, ', '', 19, 'two columns at least'],
    ['unit: N } }', 'unit: newtonz } }', 19, 'is not a unit of the table'],
    ['caption: Least pull\n', 'captoin: Least pull\n', 17, 'captoin'],
    ['source: made up', 'source: ""', 18, 'source'],
    ['pull.gauge', 'pul.gauge', 22, 'No table pul; use one of pull'],
    ['pull.gauge', 'pull.gage', 22, 'no column gage; use one of gauge, force'],
    ['pull.gauge', 'gauge', 22, 'a column is written like pull.gauge'],
    ['column: pull.gauge', 'column: pull.gauge, value: 3', 22, 'Give one of'],
    [
      'symbol: n, column',
      'shown: false, column',
      22,
      'used in a sum, it needs a symbol to be printed by',
    ],
    // Look-ups.
    ['table: pull,', 'table: push,', 25, 'No table push; use one of pull'],
    ['column: force,', 'column: farce,', 25, 'no column farce; use one of gauge, force'],
    ['where: gauge,', 'where: gouge,', 25, 'no column gouge'],
    ['is: size }', 'is: sise }', 25, '"sise" under is names no value'],
    ['where: gauge, is: size', 'where: force, is: size', 25, 'another kind of quantity'],
    ['unit: N, look', 'unit: A, look', 25, 'The column does not come out in A'],
    ['where: gauge, ', '', 25, 'where'],
    ['symbol: F,', 'symbol: F, is: 2 * 3,', 25, 'one of: is, a sum; look up'],
    ['[14, 133], [1/0, 900]', '[14, 133], [1/0, null]', 22, 'has nothing in column "Pull"'],
    ['rows off: -1', 'rows off: 0', 47, 'is the right one'],
    ['rows off: -1', 'rows off: -9', 47, 'rows off'],
    ['rows off: -1', 'column: gauge', 47, 'does not come out in N'],
    // Ways to ask.
    ['find: force', 'fnid: force', 27, 'ask in one way, by one of: find'],
    ['find: force', 'find: force, size: force', 27, 'ask in one way'],
    ['read: The pull test', 'read: ""', 27, 'read'],
    ['{ is: Two, say: not two }', '{ is: Two }', 31, 'has no say'],
    ['{ is: Two, say: not two }', '{ is: Two, right: true }', 29, 'Every option is right'],
    ['{ is: One, right: true }', '{ is: One, say: x }', 29, 'No option is right'],
    ['{ is: Two, say', '{ is: One, say', 31, '"One" stands there twice'],
    ['{ is: Two, say: not two }', '{ is: Two, sya: not two }', 31, 'sya'],
    ['      - { is: Two, say: not two }\n', '', 30, 'two options at least'],
    ['marks: 1\n  c', 'marks: 1\n    carry: own\n  c', 29, 'carry: own fits find, size and choose'],
    [', press: Press }', ' }', 34, 'an order has 3 to 8 steps'],
    ['press: Press', 'press: Strip', 34, '"Strip" stands there twice'],
    ['first: insert', 'first: inset', 36, '"inset" is no step of the order; use one of strip'],
    ['first: insert, then: strip', 'first: strip, then: insert', 36, 'is the right order'],
    ['      - { first: press, then: strip, say: nothing to press }\n', '', 36, 'two misplaced'],
    ['{ red: thin, blue: middle, yellow: thick }', '{ red: thin }', 40, 'a match has 2 to 8'],
    ['yellow: thick', 'yellow: thin', 43, '"thick" is no text to match with'],
    ['also: [none]', 'also: [thin]', 41, '"thin" under also fits a pair'],
    ['is: red,', 'is: green,', 43, '"green" is no item to match; use one of red, blue, yellow'],
    ['with: thick', 'with: thin', 43, 'is a right pair'],
    ['      - { is: red, with: thick, say: red is the thinnest }\n', '', 43, 'two mixed pairs'],
  ])('with %j as %j names line %d: %s', (...change) => {
    const [from, to, line, message] = change;
    expect(SHEET).toContain(from);
    const issues = issuesOf(SHEET.replace(from, to));
    expect(issues.map((issue) => issue.message).join('\n')).toContain(message);
    expect(issues.map((issue) => issue.line)).toContain(line);
  });

  it('names one fault of broken YAML, and how to mend it', () => {
    const issues = issuesOf(SHEET.replace('say: not two }', 'say: not two, never }'));
    expect(issues).toHaveLength(1);
    const broken = issuesOf(SHEET.replace('say: not two }', 'say: not {two} }'));
    expect(broken).toHaveLength(1);
    expect(broken[0]?.line).toBe(31);
    expect(broken[0]?.message).toContain('in quotes');
  });
});

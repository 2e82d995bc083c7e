import { describe, expect, it } from 'vitest';
import { type Drawn, type Part } from '../src/questions/compiled.ts';
import { drawQuestion } from '../src/questions/draw.ts';
import { presentQuestion } from '../src/questions/present.ts';
import { parseQuestion } from '../src/questions/sheet.ts';
import { openBank, seedNumber } from './bank-files.ts';

/** Words and figures that stand nowhere else: whatever shows up in a view has leaked. */
const PLANTED = `---
id: vd-planted-one
title: A sheet
revision: A
subject: VD
level: apply
pool: paper
lesson: "3.4"
read: planted-heading
profile: metric
language: en
author: Odile Marchetti
checked by: Ruaridh Nakamura
sources: [planted-source]
tables:
  plantedTable:
    caption: Pull
    source: made up
    columns: { plantedGauge: { is: Gauge, unit: AWG }, plantedForce: { is: Pull, unit: N } }
    rows: [[16, 67], [14, 133]]
given:
  gauge: { is: Gauge, symbol: n, column: plantedTable.plantedGauge }
  load: { is: Load, symbol: I, from: 8 A, to: 16 A, step: 1 A }
  secret: { is: planted-hidden-label, value: 0.31337 Ω, shown: false }
steps:
  plantedStep: { symbol: U_x, unit: V, is: load * secret }
  plantedLook: { symbol: F, unit: N, says: planted-says, look up: { table: plantedTable, column: plantedForce, where: plantedGauge, is: gauge } }
  plantedSize: { symbol: A_x, unit: mm², is: "load > 2 * load ? nextCable(plantedArea) : nextCable(plantedArea)" }
require:
  - plantedStep > plantedLeast
ask:
  a: { find: plantedStep, units: [V], within: 0.0771 V, marks: 2 }
  b:
    size: plantedSize
    from: 2.5 mm²
    to: 16 mm²
    marks: 1
    carry: never
    because: planted-reason
  c:
    choose:
      - { is: The first, right: true }
      - { is: The second, say: planted-say-of-option }
    marks: 1
    read: planted-heading-of-part
  d:
    choose all:
      - { is: Any, right: true, say: planted-say-of-right }
      - { is: Other, right: load > load, say: planted-say-of-choice }
    marks: 1
  e:
    order: { plantedFirst: One, plantedSecond: Two, plantedThird: Three }
    misplaced:
      - { first: plantedSecond, then: plantedFirst, say: planted-misplaced }
      - { first: plantedThird, then: plantedFirst, say: planted-misplaced }
    marks: 1
  f:
    match: { left: right, top: bottom }
    mixed:
      - { is: left, with: bottom, say: planted-mixed }
      - { is: top, with: right, say: planted-mixed }
    marks: 1
  g: { find: plantedLook, units: [N], within: exact, marks: 1 }
slips:
  - is: planted-slip-sentence
    say: planted-slip-say
    credit: planted-credit
    makes: { plantedStep: load * secret * 1.7717 }
    keep: { plantedStep: 1 }
---

Lead.

## a

Find it.

## b

Choose it.

## c

Which?

## d

All?

## e

Order?

## f

Match?

## g

Look up?
`.replace(
  'steps:',
  `  plantedArea: { is: planted-area, value: 3.3 mm², shown: false }
  plantedLeast: { is: planted-least, value: 0.0123 V, shown: false }
steps:`,
);

/** Words of a part that stand beside a wrong answer, and nowhere before. */
function wordsKept(part: Part): string[] {
  const { because, read } = part;
  const own = [because, read ?? ''].filter((text) => text !== '');
  if (part.kind === 'order') return [...own, ...part.misplaced.map(({ say }) => say)];
  if (part.kind === 'match') return [...own, ...part.mixed.map(({ say }) => say)];
  return 'options' in part ? [...own, ...part.options.flatMap(({ say }) => say ?? [])] : own;
}

/** Every string, number and key anywhere in a value. */
function everythingIn(value: unknown): string[] {
  if (value === null || typeof value !== 'object') return [String(value)];
  return Object.entries(value).flatMap(([key, inner]) => [key, ...everythingIn(inner)]);
}

const MOMENTS = ['bulk ends', 'float starts', 'quiet ends', 'protection opens', 'vehicle taken'];

describe('what leaves before marking', () => {
  const question = parseQuestion(PLANTED, 'bank/planted.md');
  const drawn = drawQuestion(question, seedNumber(1)) as Drawn;
  const view = presentQuestion(question, drawn);

  it('holds no planted key, tolerance, step, slip, reason or hidden value', () => {
    const shown = everythingIn(view);
    expect(shown.filter((text) => /planted/i.test(text))).toEqual([]);
    const { a, b } = drawn.parts;
    if (a?.kind !== 'quantity' || b?.kind !== 'options') throw new Error('planted parts');
    const figures = [a.key, a.low, a.high, a.slips[0]?.value, 0.31337, 0.0771, 1.7717];
    for (const figure of figures) {
      expect(figure).toBeTypeOf('number');
      const short = String(Number(Number(figure).toPrecision(4)));
      expect(shown.filter((text) => text.includes(short))).toEqual([]);
    }
    expect(a.slips).toHaveLength(1);
  });

  it('names the fields it sends, and no others', () => {
    expect(Object.keys(view).sort()).toEqual([
      ...['aids', 'body', 'cautions', 'curve', 'diagram', 'given', 'lead'],
      ...['marks', 'parts', 'profile', 'subject', 'tables', 'title'],
    ]);
    for (const part of view.parts) {
      expect(Object.keys(part).sort()).toEqual([
        ...['id', 'kind', 'layout', 'marks', 'options', 'prompt', 'rounding', 'rows', 'symbol'],
        'units',
      ]);
      for (const option of [...part.options, ...part.rows])
        expect(Object.keys(option)).toEqual(['id', 'text']);
    }
    for (const table of view.tables) {
      expect(Object.keys(table).sort()).toEqual(['caption', 'columns', 'rows', 'source']);
      for (const column of table.columns) expect(Object.keys(column)).toEqual(['label', 'unit']);
    }
    for (const given of view.given) {
      expect(Object.keys(given).sort()).toEqual(['label', 'symbol', 'unit', 'value']);
    }
  });

  it('holds no slip, reason or hidden value of any question of the bank', () => {
    for (const one of openBank()) {
      for (let n = 0; n < 5; n += 1) {
        const paper = drawQuestion(one, seedNumber(n)) as Drawn;
        const view = presentQuestion(one, paper);
        const shown = everythingIn(view).join('\n');
        const labels = one.givens.filter(({ isShown }) => isShown).map(({ label }) => label);
        expect(view.given.map(({ label }) => label)).toEqual(labels);
        const hidden = [
          ...one.slips.flatMap(({ is, say, credit }) => [is, say, credit ?? is]),
          ...one.parts.flatMap(wordsKept),
        ];
        expect(hidden.filter((text) => shown.includes(text))).toEqual([]);
      }
    }
  });

  it('marks no interval that ends at a time to be read off', () => {
    for (const one of openBank().filter(({ curve }) => curve)) {
      for (let n = 0; n < 20; n += 1) {
        const paper = drawQuestion(one, seedNumber(n)) as Drawn;
        const { curve } = presentQuestion(one, paper);
        const edges = (curve?.intervals ?? []).flatMap(({ fromH, toH }) => [fromH, toH]);
        // Moments alone: how long a stage lasts is no place on the time axis.
        const keys = one.steps.flatMap(({ name, how }) => {
          const isMoment = how.kind === 'read' && MOMENTS.includes(how.read.kind);
          return isMoment ? [(paper.values[name] ?? NaN) / 3600] : [];
        });
        for (const key of keys) {
          expect(edges.filter((edge) => Math.abs(edge - key) < 0.02)).toEqual([]);
        }
      }
    }
  });

  it('draws every curve in at most 400 samples of each line', () => {
    for (const one of openBank()) {
      const { curve } = presentQuestion(one, drawQuestion(one, seedNumber(3)));
      if (!curve) continue;
      const { hours, volts, amps } = curve;
      expect(hours.length).toBeGreaterThan(100);
      expect(hours.length).toBeLessThanOrEqual(400);
      expect([volts.length, amps.length]).toEqual([hours.length, hours.length]);
      expect(hours).toEqual(hours.toSorted((a, b) => a - b));
    }
  });
});

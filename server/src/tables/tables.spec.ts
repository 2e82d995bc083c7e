import { describe, expect, it } from '@jest/globals';
import { SYMBOLS } from './symbols.ts';
import { TABLES } from './tables.ts';

const tableOf = (slug: string) => TABLES.find((table) => table.slug === slug);
const rowOf = (slug: string, head: string) =>
  tableOf(slug)?.rows.find(({ cells }) => cells[0] === head)?.cells;

describe('every table', () => {
  it.each(TABLES.map((table) => [table.slug, table] as const))(
    '%s has a cell for each column, cites its sources and says what it is for',
    (_slug, { columns, rows, sources, note }) => {
      expect(rows.length).toBeGreaterThan(1);
      for (const { cells } of rows) {
        expect(cells).toHaveLength(columns.length);
        expect(cells[0]).not.toBe('');
        expect(cells.join('|')).not.toMatch(/NaN|undefined|Infinity|e-/);
      }
      expect(sources.length).toBeGreaterThan(0);
      expect(note.length).toBeGreaterThan(20);
    },
  );

  it('goes by a name of its own, as every symbol does', () => {
    for (const list of [TABLES, SYMBOLS]) {
      const slugs = list.map(({ slug }) => slug);
      expect(new Set(slugs).size).toBe(slugs.length);
    }
  });
});

describe('what is printed', () => {
  it.each([
    // IEC 60228:2004 tables 3 and 2, 4 and 25 mm² (from memory).
    ['conductors-metric', ['4', '4.95', '5.09', '4.61']],
    ['conductors-metric', ['25', '0.780', '0.795', '0.727']],
    // ASTM B258 by GNU units; NEC chapter 9 table 8 (second-hand copy), ÷ 0.3048 by bc.
    ['conductors-awg', ['10', '2.588', '5.261', '10380', '1.24', '4.07', '6']],
    ['conductors-awg', ['1/0', '8.251', '53.48', '105600', '0.122', '0.400', '70']],
    // 1 + 0.00393 × 40 and 1 + 0.00403 × 40; 1.91 × 1.1572 by bc.
    ['resistance-temperature', ['60', '1.157', '1.161', '2.21']],
    ['resistance-temperature', ['−20', '0.843', '0.839', '1.61']],
    // 33 CFR 183.425 table 5 (second-hand copy); the school's house table.
    ['rating-awg', ['10', '40', '40', '50', '55', '60', '70', '70']],
    ['rating-metric', ['10', '55', '65', '70', '80']],
    // √(25/45), √(40/60) and √(55/75) by bc; air of 50 °C leaves √(10/30) of a 60 °C jacket.
    ['ambient-formula', ['50', '0.58', '0.75', '0.82', '0.86']],
    ['ambient-formula', ['60', '', '0.58', '0.71', '0.77']],
    ['ambient-bins', ['45', '0.71', '0.82', '0.87']],
    ['ambient-bins', ['60', '', '0.58', '0.71']],
    ['grouping', ['4', '0.65', '0.75', '0.77', '0.80']],
    ['loaded-conductors', ['7 to 9', '0.70']],
    ['engine-space', ['105', '0.85']],
    ['drop-limits', ['Other circuits', '10', '1.20', '2.40']],
    ['fuses', ['7.5', 'made', '', '']],
    ['fuses', ['40', 'made', 'made', 'made']],
    ['fuse-opening', ['1.1', '360000', '']],
    // Six cells of 2.37 to 2.45 V and of 2.25 to 2.30 V (from memory).
    ['charge-voltages', ['AGM', '14.2 to 14.7', '13.5 to 13.8']],
  ])('%s: %j', (slug, cells) => {
    expect(rowOf(slug, cells[0] ?? '')).toEqual(cells);
  });
});

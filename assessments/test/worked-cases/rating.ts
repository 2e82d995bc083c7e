import { type Case } from './case.ts';

export const ratingCases: Case[] = [
  {
    slug: 'rd-chain',
    source: 'tables of 33 CFR 183.425 and BS 7671 4C1 by hand: 80 × 0.8563 × 0.70',
    given: { area: 10, ambient: 50, circuits: 3, load: 45 },
    results: { rated: 80, heat: 0.856349, bunch: 0.7, carries: 47.95554, spare: 2.95554 },
  },
  {
    slug: 'rd-engine-space',
    source: '33 CFR 183.425 table 5 and note 1 by hand: 80 × 0.85',
    given: { area: 10, jacket: 105 },
    results: { rated: 80, factor: 0.85, carries: 68 },
  },
  {
    slug: 'rd-roof-void',
    source: 'formula by hand: √(40/60) = 0.8165, × 55 A',
    given: { jacket: 90, ambient: 50, rated: 55 },
    results: { factor: 0.8164966, carries: 44.90731 },
  },
  {
    slug: 'rd-table-lookup',
    source: '33 CFR 183.425 table 5, 6 AWG at 105 °C; arithmetic by bc: rated 120, spare 30',
    given: { area: 16, jacket: 105, load: 90 },
    results: { rated: 120, spare: 30 },
  },
  {
    slug: 'rd-bin-or-formula',
    source:
      'NEC 310.15(B)(1): 41 to 45 °C, 75 °C wire 0.82; arithmetic by bc: bin 0.82, byTable 65*.82, root sqrt(32/45), byFormula 65*sqrt(32/45)',
    given: { air: 43, jacket: 75, rated: 65 },
    results: { bin: 0.82, byTable: 53.3, root: 0.843274042712, byFormula: 54.8128127763 },
  },
  {
    slug: 'rd-grouping',
    source:
      'BS 7671 table 4C1 and 33 CFR 183.425 table 5 (10 AWG); arithmetic by bc: bunch 0.65, rated 60, carries 60*.65',
    given: { circuits: 4, area: 6 },
    results: { bunch: 0.65, rated: 60, carries: 39 },
  },
  {
    slug: 'rd-size-by-current',
    source:
      'house table: 6 mm² 60 A is under 70, 10 mm² 80 A is not; arithmetic by bc: need 42/.6, size 10',
    given: { load: 42, factor: 0.6 },
    results: { need: 70, size: 10 },
  },
  {
    slug: 'rd-faa-chain',
    source:
      'FAA AC 43.13-1B example 2: 42.77, then 26 A (25.662); arithmetic by bc: high 47*.91, carries 47*.91*.6',
    given: { free: 47, height: 0.91, bundle: 0.6 },
    results: { high: 42.77, carries: 25.662 },
  },
  {
    slug: 'rd-galley-conduit',
    source:
      'BS 7671 table 4C1: 2 circuits 0.80, 4 circuits 0.65; arithmetic by bc: all 4, was 60*.8, now 60*.65, lost 48-39',
    given: { before: 2, more: 2, rated: 60 },
    results: { all: 4, was: 48, now: 39, lost: 9 },
  },
  {
    slug: 'rd-pump-room',
    source:
      'engine space 0.85; house table: 10 mm² 80 A is under 84, 16 mm² 120 A is not; arithmetic by bc: space 0.85, both .85*.7, need 50/.595, size 16',
    given: { load: 50, jacket: 105, factor: 0.7 },
    results: { space: 0.85, both: 0.595, need: 84.0336134454, size: 16 },
  },
  {
    slug: 'rd-site-office',
    source:
      'house table, 90 °C jacket: 6 mm² 55 A is under 56.3, 10 mm² 70 A is not; arithmetic by bc: factor sqrt(40/60), need 46/sqrt(40/60), size 10',
    given: { load: 46, ambient: 50 },
    results: { factor: 0.816496580928, need: 56.338264084, size: 10 },
  },
  {
    slug: 'rd-trailer-loom',
    source:
      'house table, 105 °C jacket: 4 mm² 45 A is under 50, 6 mm² 60 A is not; arithmetic by bc: heat sqrt(55/75), bunch 0.7, both sqrt(55/75)*.7, need 30/(sqrt(55/75)*.7), size 6',
    given: { load: 30, ambient: 50, circuits: 3 },
    results: {
      heat: 0.856348838578,
      bunch: 0.7,
      both: 0.599444187004,
      need: 50.0463606961,
      size: 6,
    },
  },
  {
    slug: 'rd-wheelhouse-bunch',
    source:
      'BS 7671 table 4C1 and 33 CFR 183.425 table 5; arithmetic by bc: rated 80, bunch 0.65, carries 80*.65',
    given: { area: 10, jacket: 105, circuits: 4, load: 45 },
    results: { rated: 80, bunch: 0.65, carries: 52 },
  },
];

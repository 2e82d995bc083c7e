import { electrical } from '@ferrule/assessments';
import { cellOf, column, row, type ReferenceTable } from './reference-table.ts';

const {
  ambientBin,
  ambientFactor,
  CABLE_AREAS_MM2,
  conductorsFactor,
  engineSpaceFactor,
  gaugeName,
  gaugeRatingAmps,
  groupingFactor,
  jacketsC,
  PROFILES,
  ratingAmps,
  STOCK_GAUGES,
  TABLE_AIR_C,
} = electrical;

const HOT_CONDUCTOR =
  'A cable loaded past its rating can burn skin and start a fire before its fuse opens. Temperature limits of terminals and devices may be lower than the jacket’s. Your local code decides.';
const CHAPTER_33 = '33 CFR 183.425, table 5: one cable under 50 V in 30 °C air';

const jacketColumns = (jackets: readonly number[]) =>
  jackets.map((jacket) => column(`${jacket} °C jacket`, 'A'));

function metric(): ReferenceTable {
  const jackets = jacketsC(PROFILES.metric);
  return {
    slug: 'rating-metric',
    title: 'Rating of a cable, metric sizes',
    note: `Amperes of one cable in ${TABLE_AIR_C} °C air, under 50 V. The school’s table: each size takes the row of the largest gauge that has no more copper.`,
    columns: [column('Area', 'mm²'), ...jacketColumns(jackets)],
    rows: CABLE_AREAS_MM2.map((area) =>
      row(String(area), ...jackets.map((jacket) => String(ratingAmps(area, jacket)))),
    ),
    sources: [
      { text: CHAPTER_33, provenance: 'second-hand copy' },
      { text: 'Metric sizes read down to the next gauge', provenance: 'computed' },
    ],
    caution: HOT_CONDUCTOR,
  };
}

function gauges(): ReferenceTable {
  const jackets = jacketsC(PROFILES.awg);
  return {
    slug: 'rating-awg',
    title: 'Rating of a cable, American wire gauge',
    note: `Amperes of one cable in ${TABLE_AIR_C} °C air, under 50 V.`,
    columns: [column('Gauge', 'AWG'), ...jacketColumns(jackets)],
    rows: [18, ...STOCK_GAUGES].map((gauge) =>
      row(gaugeName(gauge), ...jackets.map((jacket) => String(gaugeRatingAmps(gauge, jacket)))),
    ),
    sources: [{ text: CHAPTER_33, provenance: 'second-hand copy' }],
    caution: HOT_CONDUCTOR,
  };
}

const range = (from: number, to: number, step: number): number[] =>
  Array.from({ length: Math.round((to - from) / step) + 1 }, (_, at) => from + at * step);

function byFormula(): ReferenceTable {
  const jackets = jacketsC(PROFILES.metric);
  const factor = (jacket: number, air: number) =>
    air < jacket ? cellOf(() => ambientFactor(jacket, air).toFixed(2)) : '';
  return {
    slug: 'ambient-formula',
    title: 'Ambient factor by the formula',
    note: 'The root of the heat room left over the heat room at 30 °C: √((jacket − air) ÷ (jacket − 30)). Empty where the air is as hot as the jacket: choose another route.',
    columns: [
      column('Air', '°C'),
      ...jackets.map((jacket) => column(`${jacket} °C jacket, factor`)),
    ],
    rows: range(20, 100, 5).map((air) =>
      row(String(air), ...jackets.map((jacket) => factor(jacket, air))),
    ),
    sources: [
      { text: 'Formula of NEC 310.15(B) and IEC 60364-5-52', provenance: 'from memory' },
      { text: 'Factors', provenance: 'computed' },
    ],
    caution: HOT_CONDUCTOR,
  };
}

const BIN_JACKETS_C = [60, 75, 90];

function byBins(): ReferenceTable {
  return {
    slug: 'ambient-bins',
    title: 'Ambient factor as printed',
    note: 'Each row holds for air from over the row before it up to its own temperature. Between two whole degrees the hotter row counts.',
    columns: [
      column('Air up to', '°C'),
      ...BIN_JACKETS_C.map((jacket) => column(`${jacket} °C jacket, factor`)),
    ],
    rows: range(10, 85, 5).map((air) =>
      row(
        String(air),
        ...BIN_JACKETS_C.map((jacket) => cellOf(() => ambientBin(jacket, air).toFixed(2))),
      ),
    ),
    sources: [
      {
        text: 'NEC table 310.15(B)(1), base 30 °C, as adopted in a residential code, E3705.2',
        provenance: 'second-hand copy',
      },
    ],
    caution: HOT_CONDUCTOR,
  };
}

const ARRANGEMENTS = ['bunched', 'layer on wall', 'layer on tray', 'layer on ladder'] as const;

function grouping(): ReferenceTable {
  return {
    slug: 'grouping',
    title: 'Grouping factor',
    note: 'Loaded circuits that run together. Count circuits, not cores; a circuit that carries next to nothing does not heat its neighbours.',
    columns: [
      column('Circuits'),
      ...ARRANGEMENTS.map((lie) =>
        column(`${lie.replace(/^./, (sign) => sign.toUpperCase())}, factor`),
      ),
    ],
    rows: [1, 2, 3, 4, 5, 6, 7, 8, 9, 12, 16, 20].map((circuits) =>
      row(String(circuits), ...ARRANGEMENTS.map((lie) => groupingFactor(circuits, lie).toFixed(2))),
    ),
    sources: [{ text: 'BS 7671:2008, table 4C1', provenance: 'second-hand copy' }],
    caution: HOT_CONDUCTOR,
  };
}

function loadedConductors(): ReferenceTable {
  const steps: [string, number][] = [
    ['1 to 3', 1],
    ['4 to 6', 4],
    ['7 to 9', 7],
    ['10 to 20', 10],
    ['21 to 30', 21],
    ['31 to 40', 31],
    ['41 and more', 41],
  ];
  return {
    slug: 'loaded-conductors',
    title: 'Factor for loaded conductors in one raceway or cable',
    note: 'Count the conductors that carry the load, out and back. Another table than the grouping factor: use one of them and say which.',
    columns: [column('Conductors'), column('Factor')],
    rows: steps.map(([label, least]) => row(label, conductorsFactor(least).toFixed(2))),
    sources: [{ text: 'NEC table 310.15(B)(3)(a)', provenance: 'second-hand copy' }],
    caution: HOT_CONDUCTOR,
  };
}

function engineSpace(): ReferenceTable {
  const jackets = Object.keys(PROFILES.awg.engineFactors).map(Number);
  return {
    slug: 'engine-space',
    title: 'Factor in an engine space',
    note: 'For cable through an engine space at 50 °C, in place of the ambient factor.',
    columns: [column('Jacket', '°C'), column('Factor')],
    rows: jackets.map((jacket) =>
      row(String(jacket), engineSpaceFactor(jacket, PROFILES.awg).toFixed(2)),
    ),
    sources: [{ text: '33 CFR 183.425, note 1', provenance: 'from memory' }],
    caution: HOT_CONDUCTOR,
  };
}

/** What a cable may carry, and what takes from it. */
export const ratingTables = (): ReferenceTable[] => [
  metric(),
  gauges(),
  byFormula(),
  byBins(),
  grouping(),
  loadedConductors(),
  engineSpace(),
];

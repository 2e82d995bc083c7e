import { electrical } from '@ferrule/assessments';
import { cellOf, column, figures, row, type ReferenceTable } from './reference-table.ts';

const {
  classFiveOhmsPerKm,
  GAUGE_TABLE_C,
  gaugeAreaMm2,
  gaugeDiameterMm,
  gaugeName,
  gaugeOhmsPer1000Ft,
  gaugeOhmsPerKm,
  IEC_AREAS_MM2,
  iecOhmsPerKm,
  nextMetric,
  printedCircularMils,
  resistanceAt,
  STOCK_GAUGES,
} = electrical;

const LEAST_CAUTION =
  'A size is chosen for current first and for voltage drop second; the larger of the two is fitted. Your local code decides.';

function metric(): ReferenceTable {
  const ohms = (area: number, strands: 'class 2' | 'class 5', surface: 'plain' | 'tinned') =>
    figures(iecOhmsPerKm(area, { strands, surface }), 3);
  return {
    slug: 'conductors-metric',
    title: 'Copper conductors, metric sizes',
    note: 'Greatest resistance of one conductor at 20 °C. For a run take twice its length: out and back. Ω/km and mΩ/m are the same figure.',
    columns: [
      column('Area', 'mm²'),
      column('Class 5 flexible, plain', 'mΩ/m'),
      column('Class 5 flexible, tinned', 'mΩ/m'),
      column('Class 2 stranded, plain', 'mΩ/m'),
    ],
    rows: IEC_AREAS_MM2.map((area) =>
      row(
        String(area),
        ohms(area, 'class 5', 'plain'),
        ohms(area, 'class 5', 'tinned'),
        ohms(area, 'class 2', 'plain'),
      ),
    ),
    sources: [{ text: 'IEC 60228:2004, tables 2 and 3', provenance: 'from memory' }],
    caution: LEAST_CAUTION,
  };
}

const PRINTED_GAUGES = [18, ...STOCK_GAUGES];

function gauges(): ReferenceTable {
  return {
    slug: 'conductors-awg',
    title: 'Copper conductors, American wire gauge',
    note: `Diameter and area are those of one solid wire of the gauge. Resistance is printed for uncoated stranded copper at ${GAUGE_TABLE_C} °C, where it is ${resistanceAt(1, GAUGE_TABLE_C).toFixed(3)} times that at 20 °C. The metric size is the smallest with no less copper.`,
    columns: [
      column('Gauge', 'AWG'),
      column('Diameter', 'mm'),
      column('Area', 'mm²'),
      column('Area', 'circular mils'),
      column('Resistance at 75 °C', 'Ω per 1000 ft'),
      column('Resistance at 75 °C', 'mΩ/m'),
      column('Metric size to take', 'mm²'),
    ],
    rows: PRINTED_GAUGES.map((gauge) =>
      row(
        gaugeName(gauge),
        figures(gaugeDiameterMm(gauge), 4),
        figures(gaugeAreaMm2(gauge), 4),
        String(printedCircularMils(gauge)),
        cellOf(() => figures(gaugeOhmsPer1000Ft(gauge), 3)),
        cellOf(() => figures(gaugeOhmsPerKm(gauge), 3)),
        cellOf(() => String(nextMetric(gauge))),
      ),
    ),
    sources: [
      { text: 'Diameter and area: the formula of ASTM B258', provenance: 'from memory' },
      {
        text: 'Resistance and circular mils: NEC chapter 9, table 8, 14 AWG and larger',
        provenance: 'second-hand copy',
      },
      { text: 'The same, 18 and 16 AWG', provenance: 'from memory' },
      { text: 'Metric size to take: from the areas', provenance: 'computed' },
    ],
    caution:
      'Some cable sold by gauge for vehicles holds less copper than the gauge of the same number (from memory): buy by mm². Your local code decides.',
  };
}

const TEMPERATURES_C = [-20, -10, 0, 10, 20, 25, 30, 40, 50, 60, 70, 75, 80, 90, 105];

function temperature(): ReferenceTable {
  const at = (celsius: number) => figures(resistanceAt(classFiveOhmsPerKm(10), celsius), 3);
  return {
    slug: 'resistance-temperature',
    title: 'Resistance at temperature',
    note: 'Multiply the resistance at 20 °C by the factor of the conductor’s own temperature, which is above that of the air around it.',
    columns: [
      column('Conductor temperature', '°C'),
      column('Copper, factor'),
      column('Aluminium, factor'),
      column('For example 10 mm² class 5', 'mΩ/m'),
    ],
    rows: TEMPERATURES_C.map((celsius) =>
      row(
        String(celsius).replace('-', '−'),
        resistanceAt(1, celsius).toFixed(3),
        resistanceAt(1, celsius, 'aluminium').toFixed(3),
        at(celsius),
      ),
    ),
    sources: [
      { text: 'Copper 0.00393 per kelvin: IEC 60028', provenance: 'from memory' },
      { text: 'Aluminium 0.00403 per kelvin: IEC 60889', provenance: 'from memory' },
      { text: 'Factors and example: from these', provenance: 'computed' },
    ],
    caution: null,
  };
}

/** What conductors are and what they resist. */
export const conductorTables = (): ReferenceTable[] => [metric(), gauges(), temperature()];

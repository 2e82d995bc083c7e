import { electrical } from '@ferrule/assessments';
import { column, row, type ReferenceTable } from './reference-table.ts';

const { BLADE_A, bladeOpening, BOLT_DOWN_A, CRITICAL_CIRCUITS, dropLimitV, NEC_240_6_A, PROFILES } =
  electrical;

function dropLimits(): ReferenceTable {
  const { criticalPercent, otherPercent } = PROFILES.metric.dropLimits;
  const limit = (kind: 'critical' | 'other', nominalV: number) =>
    dropLimitV(PROFILES.metric, { kind, nominalV }).toFixed(2);
  const kinds = [
    { kind: 'critical', percent: criticalPercent, of: CRITICAL_CIRCUITS.join(', ') },
    { kind: 'other', percent: otherPercent, of: 'other circuits' },
  ] as const;
  return {
    slug: 'drop-limits',
    title: 'Voltage a circuit may lose',
    note: 'Out and back together, as a share of the nominal voltage. The school’s practice profile: say which base you took.',
    columns: [
      column('Circuits'),
      column('Share', '%'),
      column('At 12 V', 'V'),
      column('At 24 V', 'V'),
    ],
    rows: kinds.map(({ kind, percent, of }) =>
      row(
        of.replace(/^./, (sign) => sign.toUpperCase()),
        String(percent),
        limit(kind, 12),
        limit(kind, 24),
      ),
    ),
    sources: [
      { text: '3 %: ISO 10133', provenance: 'second-hand copy' },
      { text: '10 %: ISO 10133', provenance: 'from memory' },
      { text: 'Charging leads at 3 %: the school’s own practice', provenance: 'common practice' },
    ],
    caution: 'No federal rule of the United States sets either share. Your local code decides.',
  };
}

const ratingsOf = (series: readonly number[]) => new Set(series);

function fuses(): ReferenceTable {
  const [blade, bolt, code] = [BLADE_A, BOLT_DOWN_A, NEC_240_6_A].map(ratingsOf);
  const all = [...new Set([...BLADE_A, ...BOLT_DOWN_A, ...NEC_240_6_A])].sort((a, b) => a - b);
  const mark = (series: ReadonlySet<number> | undefined, rating: number) =>
    series?.has(rating) ? 'made' : '';
  return {
    slug: 'fuses',
    title: 'Fuse ratings',
    note: 'Ratings a fuse-link is made in. A fuse protects the cable: its rating is not above what the cable may carry where it lies.',
    columns: [
      column('Rating', 'A'),
      column('Blade'),
      column('Bolt-down'),
      column('Standard ratings of installation practice'),
    ],
    rows: all.map((rating) =>
      row(String(rating), mark(blade, rating), mark(bolt, rating), mark(code, rating)),
    ),
    sources: [
      { text: 'Blade: ISO 8820-3', provenance: 'from memory' },
      { text: 'Bolt-down: ISO 8820-5', provenance: 'from memory' },
      {
        text: 'Standard ratings: NEC 240.6(A), 15 to 800 A, without 225 and 400 A',
        provenance: 'second-hand copy',
      },
      { text: '225 and 400 A of the same', provenance: 'from memory' },
    ],
    caution:
      'A fuse must also be able to break the fault current where it stands: read its breaking capacity. Your local code decides.',
  };
}

function opening(): ReferenceTable {
  const seconds = (value: number | null) => (value === null ? '' : String(value));
  return {
    slug: 'fuse-opening',
    title: 'When a blade fuse opens',
    note: 'Not before the first time and not after the second. At 1.1 times its rating it carries the current for 100 hours. Figures to learn the shape by.',
    columns: [
      column('Current over rating', '×'),
      column('Not before', 's'),
      column('Not after', 's'),
    ],
    rows: [1.1, 1.35, 1.6, 2, 3.5].map((multiple) => {
      const { leastS, mostS } = bladeOpening(multiple);
      return row(String(multiple), seconds(leastS), seconds(mostS));
    }),
    sources: [{ text: 'ISO 8820-3, times of low confidence', provenance: 'from memory' }],
    caution: 'The maker’s curve decides.',
  };
}

/** What a circuit may lose and what protects it. */
export const circuitTables = (): ReferenceTable[] => [dropLimits(), fuses(), opening()];

import { electrical } from '@ferrule/assessments';
import { column, row, type ReferenceTable } from './reference-table.ts';

const { chargeVoltageRange } = electrical;

const GAS =
  'Lead-acid batteries give off explosive gas when they are charged: ventilate, and make and break connections away from the posts.';

function stages(): ReferenceTable {
  return {
    slug: 'charge-stages',
    title: 'Charge stages',
    note: 'Which stage a charger is in is read off two meters: the voltage names the stage, not the current.',
    columns: [
      column('Stage'),
      column('Held'),
      column('Voltage'),
      column('Current'),
      column('Ends when'),
    ],
    rows: [
      row('Bulk', 'current', 'climbs', 'at the charger’s limit', 'the set voltage is reached'),
      row(
        'Absorption',
        'voltage',
        'at the set voltage',
        'falls away',
        'the current has stayed under the tail, or the time is up',
      ),
      row(
        'Float',
        'voltage',
        'at the lower set voltage',
        'small, or what the loads draw',
        'the battery is called on again',
      ),
      row('Off or at rest', 'nothing', 'the battery’s own', 'none', 'the charger starts again'),
      row(
        'Cannot be told',
        'neither',
        'under its setting',
        'under its limit',
        'the cause is found: heat, a weak input, a long lead',
      ),
    ],
    sources: [
      { text: 'Stages: DIN 41773, its letters', provenance: 'second-hand copy' },
      { text: 'What ends each: common practice', provenance: 'common practice' },
    ],
    caution: GAS,
  };
}

const CHEMISTRIES = [
  ['Flooded lead-acid', 'flooded'],
  ['AGM', 'agm'],
  ['Gel', 'gel'],
  ['Lithium iron phosphate', 'lithium'],
] as const;

function voltages(): ReferenceTable {
  const printed = (chemistry: (typeof CHEMISTRIES)[number][1], stage: 'absorption' | 'float') => {
    const { least, most } = chargeVoltageRange(chemistry, stage);
    return `${least.toFixed(1)} to ${most.toFixed(1)}`;
  };
  return {
    slug: 'charge-voltages',
    title: 'Charge voltages of a 12 V battery',
    note: 'Ranges at 25 °C to check a setting by, never a set point. Twice as much for 24 V.',
    columns: [column('Battery'), column('Absorption', 'V'), column('Float', 'V')],
    rows: CHEMISTRIES.map(([name, chemistry]) =>
      row(name, printed(chemistry, 'absorption'), printed(chemistry, 'float')),
    ),
    sources: [{ text: 'Ranges of general handbooks', provenance: 'from memory' }],
    caution: `The battery maker’s figures go first. ${GAS}`,
  };
}

/** How a battery is charged. */
export const chargeTables = (): ReferenceTable[] => [stages(), voltages()];

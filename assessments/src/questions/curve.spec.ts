import { describe, expect, it } from 'vitest';
import { seedNumber } from '../../test/bank-files.ts';
import { smallSheet } from '../../test/small-sheet.ts';
import { type Compiled, type Drawn } from './compiled.ts';
import { drawQuestion } from './draw.ts';
import { presentQuestion } from './present.ts';
import { type CurveView } from './types.ts';

/** Given values that every curve below may lean on. */
const GIVEN = Object.entries({
  capacity: '110 Ah',
  charge: '50 %',
  limit: '30 A',
  absorb: '14.4 V',
  float: '13.6 V',
  tail: '2.2 A',
  opens: '14.3 V',
  soon: '0.02 h',
  time: '1 h',
  later: '2 h',
  less: '18 A',
  lead: '30 mΩ',
  every: '180 s',
  look: '5 s',
  alternator: '14.2 V',
  engage: '13.2 V',
  release: '12.8 V',
  delay: '30 s',
  cable: '15 mΩ',
  share: '90 %',
  startCapacity: '60 Ah',
  startCharge: '90 %',
})
  .map(([name, value]) => `  ${name}: { is: ${name}, symbol: x, value: ${value} }`)
  .join('\n');

interface CurveText {
  battery?: string;
  charger?: string;
  /** Whole lines of the block. */
  more?: string;
  hours?: number;
  intervals?: string;
  reads?: string;
}

const KIND = 'kind: agm';
const FLOAT = ', float: float';

/** A sheet whose only part names interval A; `first` is what is read. */
function curveSheet(text: CurveText): { question: Compiled; drawn: Drawn } {
  const { battery = KIND, charger = FLOAT, more = '', hours = 8 } = text;
  const { intervals = '{ A: bulk }', reads = 'unit: A, of: amps at, at: time' } = text;
  return smallSheet(
    `given:
${GIVEN}
curve:
  battery: { capacity: capacity, charge: charge, ${battery} }
  charger: { limit: limit, absorption: absorb, tail: tail${charger} }
  hours: ${hours}
  intervals: ${intervals}
  reads:
    first: { symbol: x, because: Read the line., ${reads} }
${more}
ask:
  a: { stage: A, marks: 1 }`,
    '## a\n\nName it.',
  );
}

const VEHICLE = `
  input:
    solar: { amps: less, shade: { from: time, until: later, amps: tail } }
    vehicle:
      from: later
      volts: alternator
      engage: engage
      release: release
      delay: delay
      cable: cable
      efficiency: share
      battery: { capacity: startCapacity, charge: startCharge }
`;

function viewOf(text: CurveText): { curve: CurveView; options: string[] } {
  const { question, drawn } = curveSheet(text);
  const { curve, parts } = presentQuestion(question, drawn);
  if (!curve) throw new Error('The sheet has no curve.');
  return { curve, options: (parts[0]?.options ?? []).map((option) => option.text).sort() };
}

const THREE = ['Absorption', 'Bulk', 'Float'];
const REST = 'Off or at rest';
const UNKNOWN = 'Cannot tell from these lines';

describe('the answers to an interval', () => {
  it('are the three stages, what the curve shows and what it offers', () => {
    expect(viewOf({}).options).toEqual(THREE);
    const offered = viewOf({ more: '  offer: [cannot tell]' });
    expect(offered.options).toEqual([...THREE, UNKNOWN].sort());
    const resting = { charger: ', after absorption: rest', intervals: '{ A: bulk, B: rest }' };
    expect(viewOf(resting).options).toEqual([...THREE, REST].sort());
  });

  it('take off and rest for one, and give every wrong one its reason', () => {
    for (const stage of ['off', 'rest']) {
      const intervals = `{ A: { stage: ${stage}, after: time } }`;
      const parked = VEHICLE.replace(/    solar.*\n/, '').replace('from: later', 'until: time');
      const text =
        stage === 'off' ? { more: parked } : { charger: ', after absorption: rest', hours: 8 };
      const { question } = curveSheet({
        ...text,
        intervals,
        more: `${text.more ?? ''}\n  offer: [rest, cannot tell]`,
      });
      const [part] = question.parts;
      const options = part?.kind === 'choice' ? part.options : [];
      expect(options.filter(({ right }) => right).map((option) => option.text)).toEqual([REST]);
      expect(options.filter(({ right, say }) => !right && say === null)).toEqual([]);
    }
  });
});

describe('the lines of a curve', () => {
  it('are the charger’s, and others where the sheet shows them', () => {
    expect(Object.keys(viewOf({}).curve).sort()).toEqual(['amps', 'hours', 'intervals', 'volts']);
    const { curve } = viewOf({
      charger: `${FLOAT}, lead: lead`,
      more: `${VEHICLE}  show: [battery volts, battery amps, input volts]\n`,
      intervals: '{ A: cannot tell, B: absorption }',
    });
    const { batteryVolts = [], batteryAmps = [], inputVolts = [], ...drawn } = curve;
    for (const line of [drawn.volts, drawn.amps, batteryVolts, batteryAmps, inputVolts]) {
      expect(line).toHaveLength(drawn.hours.length);
      expect(line.every(Number.isFinite)).toBe(true);
    }
    const lost = drawn.volts.map((volts, at) => volts - (batteryVolts[at] ?? NaN));
    lost.forEach((volts, at) => expect(volts).toBeCloseTo(0.03 * (drawn.amps[at] ?? NaN), 2));
  });

  it('keep every jump and at most 400 samples', () => {
    const looks = { charger: `${FLOAT}, pauses: { every: every, for: look }`, hours: 1 };
    const { curve } = viewOf({ ...looks, reads: 'unit: A, of: amps at, at: soon' });
    expect(curve.hours.length).toBeLessThanOrEqual(400);
    const stops = curve.amps.filter((amps, at) => amps === 0 && (curve.amps[at - 1] ?? 0) > 0);
    expect(stops).toHaveLength(20);
    expect(() => viewOf({ ...looks, hours: 12 })).toThrow('jumps too often for 400 samples');
  });
});

describe('readings', () => {
  const read = (reads: string, text: CurveText = {}): number => {
    const { drawn } = curveSheet({ ...text, reads });
    return drawn.values.first ?? NaN;
  };

  it('of bulk agree with one another', () => {
    const endsS = read('unit: h, of: bulk ends');
    expect(read('unit: Ah, of: amp-hours in bulk') / (30 * endsS)).toBeCloseTo(1, 6);
    expect(read('unit: V, of: highest volts')).toBeCloseTo(14.4, 3);
  });

  it('find the moments of the charger, its sources and its battery', () => {
    expect(read('unit: h, of: quiet ends', { charger: `${FLOAT}, quiet: { until: time }` })).toBe(
      3600,
    );
    expect(read('unit: h, of: vehicle taken', { more: VEHICLE })).toBeCloseTo(7230, 3);
    const until = VEHICLE.replace('from: later', 'until: later');
    expect(read('unit: h, of: vehicle let go', { more: until })).toBeCloseTo(7230, 3);
    const battery = 'kind: lithium, protection: { opens at: opens }';
    const opensS = read('unit: h, of: protection opens', { battery });
    expect(opensS).toBeGreaterThan(3600);
    expect(opensS).toBeLessThan(8 * 3600);
  });
});

describe('a wrong curve is refused', () => {
  it.each<[string, CurveText]>([
    ['The charger goes to float and has none', { charger: '' }],
    ['sense matters only behind a lead', { charger: `${FLOAT}, sense: battery` }],
    ['Input volts are those of the vehicle input', { more: '  show: [input volts]' }],
    ['The curve needs tail as a given value in h', { charger: `${FLOAT}, least absorption: tail` }],
    ['A reading of "bulk ends" is in h, not in A', { reads: 'unit: A, of: bulk ends' }],
    ['"quiet ends" is not on this curve', { reads: 'unit: h, of: quiet ends' }],
    ['Interval A (off) is too short to read', { intervals: '{ A: off }' }],
    ['The curve has no reading at 1 h', { hours: 0.5 }],
  ])('%s', (message, text) => {
    expect(() => curveSheet(text)).toThrow(message);
  });
});

it('a plan kept before a charger had more settings is still drawn', () => {
  const { question } = curveSheet({});
  const { battery, charger, load, hours, intervals } = question.curve ?? {};
  const before = {
    battery: { kind: battery?.kind, capacity: 'capacity', charge: 'charge', blocks: 1 },
    charger: {
      ...{ limit: 'limit', absorption: 'absorb', float: 'float', tail: 'tail' },
      longestAbsorption: charger?.longestAbsorption,
    },
    ...{ load, hours, intervals },
  };
  const kept = { ...question, curve: before };
  expect(drawQuestion(kept, seedNumber(1))).toEqual(drawQuestion(question, seedNumber(1)));
});

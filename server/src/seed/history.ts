/** What happened at the school before today, in order of time. All invented. */
export type Happening = {
  /** An instant, UTC. */
  readonly at: string;
  /** The person, by e-mail. */
  readonly who: string;
} & (
  | { readonly does: 'join' }
  | { readonly does: 'read'; readonly sheet: string; readonly paragraph: number }
  | { readonly does: 'finish'; readonly sheet: string }
  /** `slipped`: per question, in its order, the parts answered with a predicted slip. */
  | { readonly does: 'worksheet'; readonly number: string; readonly slipped: readonly string[][] }
  /** `left`: how many of the last steps were left to do; whole where it is missing. */
  | {
      readonly does: 'practise';
      readonly question: string;
      readonly left?: number;
      readonly slipped: readonly string[];
    }
  /** `slipped`: whole questions answered wrongly, by their place on the paper from the end. */
  | { readonly does: 'paper'; readonly wrongFromEnd: number }
  /** What somebody of the school, by e-mail, does to the person's certificate. */
  | { readonly does: 'lose certificate'; readonly by: string; readonly reason: string }
);

const home = (name: string) => `${name}@people.example`;
const right: readonly string[][] = [];

const join = (at: string, name: string): Happening => ({ at, who: home(name), does: 'join' });
const finish = (at: string, name: string, sheet: string): Happening => ({
  ...{ at, sheet },
  who: home(name),
  does: 'finish',
});
const worksheet = (
  at: string,
  [name, number]: [string, string],
  slipped: readonly string[][] = right,
): Happening => ({ ...{ at, number, slipped }, who: home(name), does: 'worksheet' });
const practise = (
  at: string,
  [name, question]: [string, string],
  more: { left?: number; slipped?: readonly string[] } = {},
): Happening => ({ slipped: [], ...more, ...{ at, question }, who: home(name), does: 'practise' });
const paper = (at: string, name: string, wrongFromEnd: number): Happening => ({
  ...{ at, wrongFromEnd },
  who: home(name),
  does: 'paper',
});

/** How many sheets each unit of the course has, in order. */
const sheetsOfUnits = [5, 5, 5, 4, 6, 7, 4];

/** Someone who goes through the units, a unit every second evening from that day. */
function wholeCourse(from: string, name: string, units = sheetsOfUnits.length): Happening[] {
  const evening = (unit: number, minute: number) =>
    new Date(Date.parse(`${from}T18:00:00Z`) + (unit * 48 * 60 + minute) * 60_000).toISOString();
  return sheetsOfUnits.slice(0, units).flatMap((count, at) => {
    const unit = at + 1;
    const sheets = Array.from({ length: count }, (_, sheet) => `${unit}.${sheet + 1}`);
    return [
      ...sheets.map((sheet, place) => finish(evening(at, 15 * (place + 1)), name, sheet)),
      worksheet(evening(at, 15 * (count + 2)), [name, `W${unit}`]),
    ];
  });
}

const oneWay = [['a', 'd'], [], [], ['a'], ['a']];

const happenings: Happening[] = [
  paper('2023-10-14T09:00:00Z', 'anselm.tau', 0),
  paper('2026-02-10T10:00:00Z', 'emrys.quillfeather', 1),
  {
    at: '2026-05-22T09:30:00Z',
    who: home('emrys.quillfeather'),
    does: 'lose certificate',
    by: 'desmond.feaver@harrow-quay.example',
    reason: 'The paper was sat by somebody else, as both have told the school.',
  },
  ...[
    'ifeoma.castellan',
    'hemi.tawhiri-boyd',
    'signe.holloway',
    'caspian.rudd',
    'amadi.thrale',
    'oona.kirkbride',
    'zuleika.varga',
    'maren.stoddart',
    'bartholomew.quist',
    'priya.vandermeer',
  ].map((name, index) => join(`2026-09-14T09:0${index}:00Z`, name)),
  join('2026-09-21T09:00:00Z', 'iolo.farrant'),
  join('2026-10-05T09:00:00Z', 'zoe.nguyen-lukasiewicz'),
  join('2026-11-16T09:00:00Z', 'oluwaseun.brack'),
  ...wholeCourse('2026-09-20', 'bartholomew.quist'),
  ...wholeCourse('2026-09-22', 'priya.vandermeer'),
  ...wholeCourse('2026-10-01', 'iolo.farrant'),
  ...wholeCourse('2026-10-12', 'zoe.nguyen-lukasiewicz'),
  ...wholeCourse('2026-10-18', 'hemi.tawhiri-boyd', 5),
  ...[
    ['2026-09-21', '1.1'],
    ['2026-09-28', '1.2'],
    ['2026-10-01', '1.3'],
    ['2026-10-08', '1.4'],
    ['2026-10-09', '1.5'],
    ['2026-10-15', '2.1'],
    ['2026-10-22', '2.2'],
    ['2026-11-12', '3.1'],
    ['2026-11-19', '3.2'],
    ['2026-11-26', '3.3'],
  ].map(([day = '', sheet = '']) => finish(`${day}T17:20:00Z`, 'ifeoma.castellan', sheet)),
  worksheet('2026-10-09T18:00:00Z', ['ifeoma.castellan', 'W1']),
  {
    at: '2026-11-30T19:12:00Z',
    who: home('ifeoma.castellan'),
    does: 'read',
    sheet: '3.4',
    paragraph: 4,
  },
  worksheet('2026-11-30T19:40:00Z', ['ifeoma.castellan', 'W3'], oneWay),
  practise('2026-10-12T18:00:00Z', ['ifeoma.castellan', 'cl-amps-from-watts'], { left: 1 }),
  practise('2026-10-12T18:20:00Z', ['ifeoma.castellan', 'cl-amps-from-watts']),
  practise('2026-10-26T18:10:00Z', ['ifeoma.castellan', 'cl-amps-from-watts']),
  practise('2026-11-09T18:05:00Z', ['ifeoma.castellan', 'cl-duty'], { slipped: ['a'] }),
  practise('2026-11-09T18:30:00Z', ['ifeoma.castellan', 'si-which-lead-first']),
  practise('2026-11-29T18:15:00Z', ['ifeoma.castellan', 'vd-chart-table'], { left: 2 }),
  finish('2026-10-09T17:00:00Z', 'signe.holloway', '1.4'),
  worksheet('2026-11-20T18:00:00Z', ['signe.holloway', 'W3'], oneWay),
  finish('2026-11-21T17:00:00Z', 'caspian.rudd', '3.4'),
  worksheet('2026-11-21T18:00:00Z', ['caspian.rudd', 'W3'], [['a'], [], ['a'], [], []]),
  worksheet('2026-11-22T18:00:00Z', ['amadi.thrale', 'W3'], oneWay),
  worksheet('2026-11-23T18:00:00Z', ['oona.kirkbride', 'W3'], [['d'], ['a'], [], [], ['a']]),
  finish('2026-11-24T18:00:00Z', 'zuleika.varga', '1.4'),
  worksheet('2026-11-24T19:00:00Z', ['zuleika.varga', 'W1'], [['b'], ['a'], ['a'], ['b']]),
  {
    at: '2026-11-15T18:30:00Z',
    who: home('maren.stoddart'),
    does: 'read',
    sheet: '1.4',
    paragraph: 3,
  },
  finish('2026-11-25T18:30:00Z', 'oluwaseun.brack', '1.4'),
  paper('2026-10-27T10:00:00Z', 'bartholomew.quist', 1),
  paper('2026-10-27T10:05:00Z', 'priya.vandermeer', 0),
  paper('2026-11-24T10:00:00Z', 'zoe.nguyen-lukasiewicz', 3),
];

export const history: readonly Happening[] = happenings.toSorted((a, b) =>
  a.at.localeCompare(b.at),
);

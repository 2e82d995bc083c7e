import {
  type ChoicePart,
  type Drawn,
  type Part,
  type QuantityPart,
  type SizePart,
} from './compiled.ts';
import { type Judged, type Page } from './judged.ts';
import { remarksOnChoices, remarksOnMatch, remarksOnOrder } from './listed-remarks.ts';
import { fillIn } from './placeholders.ts';
import { type RawAnswer, type Remark, type Verdict } from './types.ts';

/** What the marker writes beside a part. */
export function remarksOn(page: Page, judged: Judged): Remark[] {
  const fill = (text: string): string => fillIn(text, page.question.givens, page.drawn.values);
  return rawRemarks(page, judged).map(({ sign, heading, text }) => ({
    sign,
    heading: heading === null ? null : fill(heading),
    text: fill(text),
  }));
}

function rawRemarks(page: Page, judged: Judged): Remark[] {
  return REMARKS[judged.finding.verdict](page, judged);
}

const gained = (heading: string | null, text: string): Remark => ({
  sign: 'gained',
  heading,
  text,
});
const lost = (heading: string | null, text: string): Remark => ({ sign: 'lost', heading, text });
const note = (text: string): Remark => ({ sign: 'note', heading: null, text });

function onRight({ finding }: Judged): Remark[] {
  const remarks = [gained(null, 'right')];
  return finding.rule === 'right-on-own-rounding'
    ? [...remarks, note('worked on from your own rounded value: keep a figure more until the end')]
    : remarks;
}

function partsUsed({ sums }: Judged): string {
  return (sums?.account?.parts ?? []).map((id) => `(${id})`).join(' and ');
}

const ROUNDED_EARLY = 'rounded too early: carry three figures or more until the last line';

function onSlip({ question }: Page, { finding, part }: Judged): Remark[] {
  const slip = question.slips[finding.slip ?? -1];
  if (!slip) return withHalf(finding.marks, part, lost(null, ROUNDED_EARLY));
  const remarks = [lost(null, slip.say)];
  // A size that is unsafe says so, whichever way it was reached.
  if (part.carry === 'never') remarks.push(note(part.because));
  return finding.marks > 0 && slip.credit !== null
    ? [gained(null, slip.credit), ...remarks]
    : remarks;
}

function onWrongUnit({ finding, typed, part }: Judged): Remark[] {
  const fits = finding.fits?.symbol ?? '';
  const given = typed?.unit.symbol === '' ? 'no unit' : (typed?.unit.symbol ?? 'another unit');
  const text = `wrong unit: the figure is right in ${fits}, you gave ${given}`;
  return withHalf(finding.marks, part, lost(null, text));
}

function onPowerOfTen({ finding, part }: Judged): Remark[] {
  const power = finding.power ?? 0;
  const factor = String(10 ** Math.abs(power));
  const text = `right figures, ${factor} times too ${power > 0 ? 'large' : 'small'}: check prefix and decimal point`;
  return withHalf(finding.marks, part, lost(null, text));
}

function withHalf(marks: number, part: Part, remark: Remark): Remark[] {
  return marks > 0 ? [gained(null, `sum right: ${marks} of ${part.marks} kept`), remark] : [remark];
}

function onWrong(page: Page, judged: Judged): Remark[] {
  const { part, answer } = judged;
  switch (part.kind) {
    case 'choice':
      return [lost(null, optionWords(page, part, answer))];
    case 'choices':
      return [...remarksOnChoices(page, part, judged), ...neverWords(part)];
    case 'order':
      return [...remarksOnOrder(page, part, judged), ...neverWords(part)];
    case 'match':
      return [...remarksOnMatch(page, part, judged), ...neverWords(part)];
    case 'size':
      return [lost(null, sizeWords(page.drawn, { part, answer }))];
    case 'quantity':
      return onWrongQuantity(page, part);
  }
}

function onWrongQuantity(page: Page, part: QuantityPart): Remark[] {
  const step = page.question.steps.find(({ name }) => name === part.step);
  const why =
    step?.how.kind === 'read'
      ? `read it again: ${step.how.because}`
      : 'no slip we know leads here: put your lines beside the worked ones';
  return [lost(null, why), ...neverWords(part)];
}

/** Why a part is judged without mercy: it is a matter of safety. */
function neverWords(part: Part): Remark[] {
  return part.carry === 'never' ? [note(part.because)] : [];
}

function optionWords({ drawn }: Page, part: ChoicePart, answer: RawAnswer): string {
  const held = drawn.parts[part.id];
  const chosen =
    held?.kind === 'options' ? held.options.find(({ id }) => id === answer.option) : undefined;
  return part.options[chosen?.index ?? -1]?.say ?? 'not this one';
}

function sizeWords(drawn: Drawn, { part, answer }: { part: SizePart; answer: RawAnswer }): string {
  const held = drawn.parts[part.id];
  if (held?.kind !== 'options') return '';
  const place = (id: string | null): number => held.options.findIndex((one) => one.id === id);
  return place(answer.option) < place(held.right)
    ? `too small for the job: ${part.because || 'it must be the next size that passes'}`
    : 'it would do, but a smaller stock size does as well';
}

const REMARKS: Record<Verdict, (page: Page, judged: Judged) => Remark[]> = {
  right: (_, judged) => onRight(judged),
  'carried-forward': (_, judged) => [
    gained('Carried forward', `right sum on your own answer to ${partsUsed(judged)}`),
  ],
  'not-carried': (_, { part }) => [lost('Not carried forward', part.because)],
  slip: onSlip,
  'wrong-unit': (_, judged) => onWrongUnit(judged),
  'power-of-ten': (_, judged) => onPowerOfTen(judged),
  blank: () => [lost(null, 'not answered')],
  'not-understood': (_, { finding }) => [lost('Not understood', finding.say())],
  wrong: onWrong,
  'partly-right': onWrong,
};

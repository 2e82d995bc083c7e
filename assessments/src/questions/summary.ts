import { type Compiled } from './compiled.ts';
import { type Judged } from './judged.ts';
import { type Verdict } from './types.ts';

const WORDS = ['No', 'One', 'Two', 'Three', 'Four', 'Five', 'Six', 'Seven', 'Eight'];

const OFF: readonly Verdict[] = ['wrong', 'wrong-unit', 'power-of-ten', 'not-understood'];

/** One or two sentences that lead a marked question: what went wrong, and what did not. */
export function summarise(question: Compiled, judged: readonly Judged[]): string {
  const count = (verdict: string): number =>
    judged.filter(({ finding }) => finding.verdict === verdict).length;
  if (judged.length === 0) return 'Worked in full, with nothing left to answer.';
  if (count('right') === judged.length) return 'All right, every part of it.';
  if (count('blank') === judged.length) return 'Nothing was answered.';
  const slips = [...new Set(judged.flatMap(({ finding }) => finding.slip ?? []))];
  const isRounded = judged.some(({ finding }) => finding.rule === 'rounded-early');
  const carriedOn = count('carried-forward') > 0 || count('not-carried') > 0;
  const off = judged.filter(({ finding }) => OFF.includes(finding.verdict)).length;
  const partly = count('partly-right');
  const found = { slips: slips.length + Number(isRounded), off, partly, blank: count('blank') };
  return [
    headline(found, carriedOn),
    ...slips.slice(0, 2).map((slip) => question.slips[slip]?.is ?? ''),
    isRounded ? 'You rounded too early.' : '',
    off + partly === 0 && carriedOn ? 'Your method after that was sound.' : '',
  ]
    .filter((sentence) => sentence !== '')
    .join(' ');
}

interface Found {
  slips: number;
  off: number;
  partly: number;
  blank: number;
}

/** "One slip, two parts wrong, one partly right, carried through." */
function headline({ slips, off, partly, blank }: Found, carriedOn: boolean): string {
  const counted: [number, string][] = [
    [slips, slips === 1 ? 'slip' : 'slips'],
    [off, off === 1 ? 'part wrong' : 'parts wrong'],
    [partly, off > 0 ? 'partly right' : partly === 1 ? 'part partly right' : 'parts partly right'],
    [blank, 'not answered'],
  ];
  const said = counted.filter(([count]) => count > 0);
  const parts = said.map(([count, what], index) => `${numberWord(count, index > 0)} ${what}`);
  return `${[...parts, ...(carriedOn ? ['carried through'] : [])].map(capitalFirst).join(', ')}.`;
}

function numberWord(count: number, isInside: boolean): string {
  const word = WORDS[count] ?? String(count);
  return isInside ? word.toLowerCase() : word;
}

function capitalFirst(text: string, index: number): string {
  return index === 0 ? text.charAt(0).toUpperCase() + text.slice(1) : text;
}

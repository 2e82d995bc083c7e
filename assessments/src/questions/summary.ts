import { type Compiled } from './compiled.ts';
import { type Judged } from './judged.ts';

const WORDS = ['No', 'One', 'Two', 'Three', 'Four', 'Five', 'Six', 'Seven', 'Eight'];

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
  const off = judged.filter(({ finding }) =>
    ['wrong', 'partly-right', 'wrong-unit', 'power-of-ten', 'not-understood'].includes(
      finding.verdict,
    ),
  ).length;
  return [
    headline({ slips: slips.length + Number(isRounded), off, carriedOn, blank: count('blank') }),
    ...slips.slice(0, 2).map((slip) => question.slips[slip]?.is ?? ''),
    isRounded ? 'You rounded too early.' : '',
    off === 0 && carriedOn ? 'Your method after that was sound.' : '',
  ]
    .filter((sentence) => sentence !== '')
    .join(' ');
}

function headline(found: {
  slips: number;
  off: number;
  carriedOn: boolean;
  blank: number;
}): string {
  const { slips, off, carriedOn, blank } = found;
  const parts = [
    slips > 0 ? `${WORDS[slips] ?? slips} slip${slips === 1 ? '' : 's'}` : '',
    off > 0 ? `${numberWord(off, slips > 0)} part${off === 1 ? '' : 's'} wrong` : '',
    blank > 0 ? `${numberWord(blank, slips + off > 0)} not answered` : '',
    carriedOn ? 'carried through' : '',
  ].filter((part) => part !== '');
  return `${capital(parts.join(', '))}.`;
}

function numberWord(count: number, isInside: boolean): string {
  const word = WORDS[count] ?? String(count);
  return isInside ? word.toLowerCase() : word;
}

function capital(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1);
}

import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import {
  drawQuestion,
  judgeQuestion,
  keyAnswers,
  markQuestion,
  parseQuestion,
} from '@ferrule/assessments';
import { fromRoot } from '../steps/paths.mjs';
import { bareSums } from './bare-sums.mjs';
import { compare, medianOf, repeated } from './rounds.mjs';

const bank = fromRoot('assessments', 'bank');
const seed = '5eed'.repeat(16);
const rounds = 9;
const turn = { milliseconds: 40, batch: 1 };
const answered = { right: [], slip: ['a'] };
/** Drawing and judging takes at most so much of what mathjs takes for the sums alone. */
const mostOfMathjs = 0.5;

const asStored = (value) => JSON.parse(JSON.stringify(value));

function openSheet(file) {
  const source = readFileSync(join(bank, file), 'utf8');
  // As the server holds it: compiled, stored as JSON and read back.
  const question = asStored(parseQuestion(source, file));
  const drawn = asStored(drawQuestion(question, seed));
  const bare = bareSums({ source, question, drawn });
  const answers = Object.fromEntries(
    Object.entries(answered).map(([how, slips]) => [how, keyAnswers(question, drawn, slips)]),
  );
  return { question, drawn, bare, answers };
}

/** Every question of the bank, and those of them that mathjs can work. */
function openBank() {
  const files = readdirSync(bank, { recursive: true }).filter((name) => /\/[^/]+\.md$/.test(name));
  const all = files.sort().map(openSheet);
  return { all, sums: all.filter(({ bare }) => bare !== null) };
}

function requireRight({ question, drawn, answers }) {
  const { marks, outOf } = judgeQuestion(question, drawn, answers.right);
  if (marks === outOf) return;
  throw new Error(`The bench's right answers to ${question.meta.slug} got ${marks} of ${outOf}.`);
}

const draw = ({ question }) => drawQuestion(question, seed);
const judge = (how) => (sheet) => judgeQuestion(sheet.question, sheet.drawn, sheet.answers[how]);
const mark = (how) => (sheet) => markQuestion(sheet.question, sheet.drawn, sheet.answers[how]);
const drawAnd = (then) => (sheet) => {
  draw(sheet);
  then(sheet);
};

const bareDraw = ({ bare }) => bare.draw();
const bareSlip = ({ bare }) => {
  bare.draw();
  bare.judgeSlip();
};

const perQuestion = ({ ours, bare, ...ratios }, count) => ({
  ...{ ours: ours / count, bare: bare / count },
  ...ratios,
});

const overAll = (sheets, work) => repeated(() => sheets.forEach(work), turn);

/** Questions a second on one processor; a question of a curve runs its charger. */
async function ratesOf({ all, sums }) {
  const rate = async (what, sheets, work) => {
    const milliseconds = await medianOf(overAll(sheets, work), rounds);
    return { what, perSecond: Math.round((1000 * sheets.length) / milliseconds) };
  };
  return [
    await rate(`Draws, ${sums.length} questions of sums`, sums, draw),
    await rate(`Draws, all ${all.length} questions, curves run`, all, draw),
    await rate('Marks and verdicts, all right', all, judge('right')),
    await rate('Marks and verdicts, a slip in the first part', all, judge('slip')),
    await rate('Marks with the lines and words, all right', all, mark('right')),
    await rate('Marks with the lines and words, a slip', all, mark('slip')),
  ];
}

/**
 * Drawing and marking every question against mathjs working the same expressions with units, and
 * how many of each are done in a second. What ours does besides (draws that are rejected, opaque
 * names, reading what was typed, the marker's rules) counts for ours alone.
 */
export async function measureQuestions({ signal }) {
  const { all, sums } = openBank();
  all.forEach(requireRight);
  const row = async (what, { ours, bare, bound }) => {
    const sides = { ours: overAll(sums, ours), bare: overAll(sums, bare) };
    const { processor } = await compare({ ...sides, rounds, signal });
    return { what, ...perQuestion(processor, sums.length), bound };
  };
  const bound = mostOfMathjs;
  const rows = [
    await row(`Draw and mark, all right (${sums.length} of ${all.length} questions)`, {
      ...{ ours: drawAnd(judge('right')), bare: bareDraw, bound },
    }),
    await row('Draw and mark, a slip in the first part', {
      ...{ ours: drawAnd(judge('slip')), bare: bareSlip, bound },
    }),
    await row('  with the lines and words too, all right', {
      ...{ ours: drawAnd(mark('right')), bare: bareDraw },
    }),
    await row('  with the lines and words too, a slip', {
      ...{ ours: drawAnd(mark('slip')), bare: bareSlip },
    }),
  ];
  return { rows, rates: await ratesOf({ all, sums }) };
}

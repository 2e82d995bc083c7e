import { drawQuestion, judgeQuestion, keyAnswers, parseQuestion } from '@ferrule/assessments';
import { compare, repeated } from './rounds.mjs';

const seed = '5eed'.repeat(16);
const rounds = 9;
const turn = { milliseconds: 30, batch: 50 };
const few = 2;
const many = 8;
const letters = 'abcdefgh';

const sectionOf = (letter) => `## ${letter}\n\nFind it.\n`;

/** A chain of steps, each asked for, carried on from the one before and with a slip of its own. */
function chainOf(count) {
  const parts = [...letters.slice(0, count)];
  const nameOf = (at) => (at < 0 ? 'supply' : `stage${letters[at].toUpperCase()}`);
  const steps = parts.map(
    (_, at) =>
      `  ${nameOf(at)}: { symbol: U_${at + 1}, unit: V, is: ${nameOf(at - 1)} - load * lead }`,
  );
  const asks = parts.map(
    (letter, at) =>
      `  ${letter}: { find: ${nameOf(at)}, units: [V], within: 0.5 %, marks: 2, carry: own }`,
  );
  const slips = parts.map(
    (_, at) =>
      `  - { is: Slip ${at + 1}, say: take it off, makes: { ${nameOf(at)}: ${nameOf(at - 1)} + load * lead } }`,
  );
  return `---
id: vd-chain-of-${count}
title: A chain of ${count}
revision: A
subject: VD
level: apply
pool: practice
lesson: "3.4"
profile: metric
language: en
author: Odile Marchetti
checked by: Ruaridh Nakamura
sources: [Definitions]
given:
  supply: { is: Supply, symbol: U, from: 24 V, to: 26 V, step: 0.1 V }
  load: { is: Load, symbol: I, from: 20 A, to: 30 A, step: 1 A }
  lead: { is: Lead, symbol: R, from: 20 mΩ, to: 40 mΩ, step: 1 mΩ }
steps:
${steps.join('\n')}
require:
  - ${nameOf(count - 1)} > supply / 3
ask:
${asks.join('\n')}
slips:
${slips.join('\n')}
---

A chain.

${parts.map(sectionOf).join('\n')}`;
}

function workOf(count, slips) {
  const question = parseQuestion(chainOf(count), `chain-of-${count}.md`);
  const drawn = drawQuestion(question, seed);
  const answers = keyAnswers(question, drawn, slips);
  return () => {
    drawQuestion(question, seed);
    judgeQuestion(question, drawn, answers);
  };
}

/** A little over a straight line is measuring; an eighth part that costs double is not. */
const mostForEachPart = 1.3;
const perPart = (milliseconds, count) => milliseconds / count;

/** Time for each part of a question of eight against one of two: 1 is growth in a straight line. */
export async function measureGrowth({ signal }) {
  const row = async (what, slips) => {
    const sides = { ours: workOf(many, slips), bare: workOf(few, slips) };
    const { processor } = await compare({
      ...{ rounds, signal },
      ours: repeated(sides.ours, turn),
      bare: repeated(sides.bare, turn),
    });
    const scale = few / many;
    return {
      what,
      ours: perPart(processor.ours, many),
      bare: perPart(processor.bare, few),
      ratio: processor.ratio * scale,
      low: processor.low * scale,
      high: processor.high * scale,
      bound: mostForEachPart,
    };
  };
  return [
    await row(`Draw and mark, for each of ${many} parts against each of ${few}`, []),
    await row('  the same with a slip in the first part, carried through', ['a']),
  ];
}

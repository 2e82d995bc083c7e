import type { Answers, QuestionView } from '../../src/questions/question-view.ts';
import type { PracticeMarked, PracticeView } from '../../src/practice/practice.schemas.ts';
import type { Caller } from '../sign-in.ts';
import { answersTo } from './worksheet.ts';

export async function startPractice(
  caller: Caller,
  question: string,
  left?: number,
): Promise<PracticeView> {
  const body = left === undefined ? { question } : { question, left };
  const reply = await caller.call('POST', '/api/practice', body);
  if (reply.status !== 201) throw new Error(JSON.stringify(reply.body));
  return reply.body as PracticeView;
}

export async function answerPractice(
  caller: Caller,
  id: string,
  answers: Answers,
): Promise<PracticeMarked> {
  const reply = await caller.call('POST', `/api/practice/${id}/answers`, { answers });
  if (reply.status !== 200) throw new Error(JSON.stringify(reply.body));
  return reply.body as PracticeMarked;
}

/** The answers to the parts that were asked. */
export const onlyAsked = ({ asked }: PracticeView, answers: Answers): Answers =>
  Object.fromEntries(Object.entries(answers).filter(([part]) => asked.includes(part)));

interface Practised {
  readonly question: string;
  readonly left?: number;
  readonly answers?: (question: QuestionView) => Answers;
}

/** One question from start to marking; answered right unless said otherwise. */
export async function practise(caller: Caller, practised: Practised): Promise<PracticeMarked> {
  const view = await startPractice(caller, practised.question, practised.left);
  const answers = (practised.answers ?? answersTo)(view.question);
  return answerPractice(caller, view.id, onlyAsked(view, answers));
}

/** A practice question that asks in each of the ways of listing, beside a printed table. */
export const listsSheet = (): string => `---
id: te-lists
title: A crimp in its order
revision: A
subject: TE
level: recall
pool: practice
lesson: "2.1"
profile: awg
language: en
author: Odile Marchetti
checked by: Ruaridh Nakamura
sources: ['Order of work: common practice, no source']
tables:
  pull:
    caption: Least pull on a crimp
    source: 'from memory'
    columns: { gauge: { is: Gauge, unit: AWG }, force: { is: Least pull, unit: N } }
    rows: [[16, 67], [14, 133], [12, 156]]
given:
  size: { is: Gauge, symbol: n, column: pull.gauge }
steps:
  force: { symbol: F, unit: N, look up: { table: pull, column: force, where: gauge, is: size } }
ask:
  a:
    choose all:
      - { is: strip, right: true }
      - { is: crimp, right: true }
      - { is: twist, say: a twisted end does not fill the barrel }
    marks: 2
  b:
    order: { strip: Strip the end, crimp: Crimp the lug, pull: Pull to test }
    misplaced:
      - { first: pull, then: crimp, say: there is nothing to pull yet }
      - { first: crimp, then: strip, say: the lug grips bare wire }
    marks: 2
  c:
    match: { red: small, yellow: large }
    also: [none]
    mixed:
      - { is: red, with: large, say: a loose lug pulls off }
      - { is: yellow, with: small, say: the strands do not go in }
    marks: 2
  d: { find: force, units: [N], within: 1 %, marks: 1 }
slips:
  - is: You read one row too far up.
    say: run a finger along the row
    makes: { force: { look up: { table: pull, column: force, where: gauge, is: size, rows off: -1 } } }
  - is: You read the row below.
    say: run a finger along the row
    makes: { force: { look up: { table: pull, column: force, where: gauge, is: size, rows off: 1 } } }
---

A lug and a tool.

## a

What is right?

## b

Put the work in order.

## c

Which lug?

## d

How hard must you pull?
`;

const chosen = (options: string[]) => ({
  ...{ text: '', unit: null, option: null, working: '', options },
});

/** Right answers to the question that lists, from what the trainee sees of it. */
export function answersToLists({ parts, given, tables }: QuestionView): Answers {
  const idOf = (part: string, text: string) =>
    parts.find(({ id }) => id === part)?.options.find((option) => option.text === text)?.id ?? '';
  const lugs: Record<string, string> = { red: 'small', yellow: 'large' };
  const rows = parts.find(({ id }) => id === 'c')?.rows ?? [];
  const gauge = given.find(({ symbol }) => symbol === 'n')?.value;
  const force = tables[0]?.rows.find(([size]) => size === gauge)?.[1] ?? '';
  return {
    a: chosen(['crimp', 'strip'].map((text) => idOf('a', text))),
    b: chosen(['Strip the end', 'Crimp the lug', 'Pull to test'].map((text) => idOf('b', text))),
    c: chosen(rows.map(({ text }) => idOf('c', lugs[text] ?? ''))),
    d: { text: force, unit: 'N', option: null, working: '' },
  };
}

import { type Compiled, type Drawn } from '../src/questions/compiled.ts';
import { drawQuestion } from '../src/questions/draw.ts';
import { parseQuestion } from '../src/questions/sheet.ts';
import { seedNumber } from './bank-files.ts';

/** A question of a few lines: the parts of its front matter that matter to one test. */
export function smallSheet(front: string, sections: string): { question: Compiled; drawn: Drawn } {
  const source = `---
id: vd-small-one
title: A small one
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
${front}
---

Lead.

${sections}
`;
  const question = parseQuestion(source, 'bank/small.md') as Compiled;
  return { question, drawn: drawQuestion(question, seedNumber(1)) as Drawn };
}

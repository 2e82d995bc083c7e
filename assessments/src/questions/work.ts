import { openDrawn, openQuestion } from './compiled.ts';
import { workedLines } from './explain.ts';
import { fillIn } from './placeholders.ts';
import { presentDiagram, presentGivens, presentTables } from './present.ts';
import { type CompiledQuestion, type DrawnQuestion, type WorkedAnswer } from './types.ts';

/** The worked answer of a draw, part by part: what a lesson prints and a marked paper shows. */
export function workQuestion(stored: CompiledQuestion, drawing: DrawnQuestion): WorkedAnswer {
  const question = openQuestion(stored);
  const drawn = openDrawn(question, drawing);
  const shown = new Set<string>();
  return {
    title: question.meta.title,
    lead: fillIn(question.lead, question.givens, drawn.values),
    given: presentGivens(question, drawn),
    tables: presentTables(question),
    diagram: presentDiagram(question, drawn),
    curve: drawn.curve,
    parts: question.parts.map((part) => ({
      id: part.id,
      prompt: fillIn(part.prompt, question.givens, drawn.values),
      lines: workedLines({ question, drawn, shown }, part),
    })),
  };
}

import { openSheet } from '../sheets/sheet-file.ts';
import {
  type Compiled,
  FORMAT_VERSION,
  type Given,
  type Part,
  type Slip,
  type Step,
} from './compiled.ts';
import { planCurve } from './curve-plan.ts';
import { type Expr, namesIn } from './expression.ts';
import { misnamedIn } from './placeholders.ts';
import { attempt, type Desk, stopIfWrong } from './sheet-desk.ts';
import { readPart } from './sheet-parts.ts';
import { type Sheet, sheetSchema } from './sheet-schema.ts';
import { readSlip } from './sheet-slips.ts';
import { readTables } from './sheet-tables.ts';
import { conditionIn, readGivens, readSteps } from './sheet-steps.ts';
import { tryDraws } from './trial-draws.ts';
import { type CompiledQuestion, type DiagramView } from './types.ts';

/**
 * Reads a question sheet, checks it whole and turns it into the form that is kept:
 * schema, names, units, bounds, and a run of trial draws.
 *
 * @throws {SheetInvalid} naming the file and the line of everything that is wrong.
 */
export function parseQuestion(source: string, path: string): CompiledQuestion {
  const file = openSheet(source, path, sheetSchema);
  const desk: Desk = { path, sheet: file.front, file, issues: [], dimensions: new Map() };
  const tables = readTables(desk);
  const givens = readGivens(desk, tables);
  const steps = readSteps(desk, { givens, tables });
  const require = desk.sheet.require.flatMap((text, index) =>
    attempt(desk, ['require', index], () => conditionIn(text, desk.dimensions)),
  );
  const parts = readParts(desk, givens, steps);
  const slips = desk.sheet.slips.flatMap((slip, index) =>
    attempt(desk, ['slips', index], () =>
      readSlip(slip, { parts, steps, tables, sheet: desk.sheet, dimensions: desk.dimensions }),
    ),
  );
  const [curve = null] = attempt(desk, ['curve'], () =>
    desk.sheet.curve ? planCurve(desk.sheet.curve, givens) : null,
  );
  checkWords(desk, givens);
  checkSymbols(desk, givens, printedSums(steps, slips));
  stopIfWrong(desk);
  const question: Compiled = {
    formatVersion: FORMAT_VERSION,
    meta: metaOf(desk.sheet, parts),
    profile: desk.sheet.profile,
    aids: desk.sheet.aids,
    cautions: desk.sheet.cautions,
    ...leadAndBody(file.intro),
    givens,
    tables,
    steps,
    require,
    parts,
    slips,
    diagram: diagramOf(desk.sheet.diagram),
    curve,
    read: desk.sheet.read ?? null,
  };
  tryDraws(desk, question);
  stopIfWrong(desk);
  return question;
}

function readParts(desk: Desk, givens: readonly Given[], steps: readonly Step[]): Part[] {
  const { sections } = desk.file;
  for (const { heading, line } of sections) {
    if (!Object.hasOwn(desk.sheet.ask, heading)) {
      desk.issues.push({ line, message: `Section "## ${heading}" is no part; name it under ask.` });
    }
  }
  const condition = (text: string): Expr => conditionIn(text, desk.dimensions);
  return Object.entries(desk.sheet.ask).flatMap(([id, ask]) =>
    attempt(desk, ['ask', id], () => {
      const prompt = sections.find((section) => section.heading === id)?.text ?? '';
      return readPart(id, { ask, prompt }, { givens, steps, curve: desk.sheet.curve, condition });
    }),
  );
}

function checkWords(desk: Desk, givens: readonly Given[]): void {
  const names = new Set(givens.filter((given) => given.isShown).map((given) => given.name));
  const { intro, introLine, sections } = desk.file;
  const words: [number, unknown][] = [
    [introLine, intro],
    ...sections.map(({ line, text }): [number, string] => [line, text]),
    [desk.file.lineOf(['ask']), desk.sheet.ask],
    [desk.file.lineOf(['slips']), desk.sheet.slips],
    [desk.file.lineOf(['diagram']), desk.sheet.diagram],
  ];
  for (const [line, texts] of words) {
    for (const name of misnamedIn(texts, names)) {
      const message = `{${name}} names no shown value; use one of ${[...names].join(', ')}.`;
      desk.issues.push({ line, message });
    }
  }
}

/** The sums that a worked answer or a marked paper prints. */
function printedSums(steps: readonly Step[], slips: readonly Slip[]): Expr[] {
  return [
    ...steps.flatMap(({ how }) => (how.kind === 'sum' ? [how.expr] : [])),
    ...slips.flatMap(({ makes }) => makes.map(({ expr }) => expr)),
  ];
}

/** A figure that is drawn anew each time can stand in a formula by its symbol only. */
function checkSymbols(desk: Desk, givens: readonly Given[], printed: readonly Expr[]): void {
  const named = new Set(printed.flatMap((expr) => [...namesIn(expr)]));
  for (const { name, symbol, source } of givens) {
    if (symbol !== null || source.kind === 'value' || !named.has(name)) continue;
    const message = `given › ${name}: Drawn and used in a sum, it needs a symbol to be printed by.`;
    desk.issues.push({ line: desk.file.lineOf(['given', name]), message });
  }
}

function metaOf(sheet: Sheet, parts: readonly Part[]): Compiled['meta'] {
  return {
    slug: sheet.id,
    title: sheet.title,
    revision: sheet.revision,
    subject: sheet.subject,
    level: sheet.level,
    pool: sheet.pool,
    lesson: sheet.lesson,
    marks: parts.reduce((sum, part) => sum + part.marks, 0),
    author: sheet.author,
    checkedBy: sheet['checked by'],
    sources: sheet.sources,
    language: sheet.language,
  };
}

function leadAndBody(intro: string): { lead: string; body: string } {
  const [lead = '', ...rest] = intro.split(/\n\s*\n/);
  return { lead: lead.replace(/\n/g, ' '), body: rest.join('\n\n') };
}

function diagramOf(diagram: Sheet['diagram']): DiagramView | null {
  if (!diagram) return null;
  const { kind, source, fuse, load, cable, length, draws } = diagram;
  return {
    kind,
    labels: { source, fuse, load, loadNote: diagram['load note'], cable, length },
    load: draws,
  };
}

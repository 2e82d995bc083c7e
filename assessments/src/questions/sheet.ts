import { SheetInvalid } from '../sheets/errors.ts';
import { openSheet, type SheetFile } from '../sheets/sheet-file.ts';
import { type Compiled, FORMAT_VERSION, type Given, type Part, type Step } from './compiled.ts';
import { planCurve } from './curve-plan.ts';
import { dimensionOf, outcomeOf } from './dimensions.ts';
import { drawQuestion } from './draw.ts';
import { type Expr, readExpression } from './expression.ts';
import { refusalOf } from './names.ts';
import { misnamedIn } from './placeholders.ts';
import { readGiven } from './sheet-givens.ts';
import { readPart } from './sheet-parts.ts';
import { type Sheet, sheetSchema } from './sheet-schema.ts';
import { readSlip } from './sheet-slips.ts';
import { type CompiledQuestion, type DiagramView } from './types.ts';
import { parseUnit } from './unit-expression.ts';
import { type Dimension, sameDimension } from './units.ts';

/** A sheet being checked: what is declared so far, and what is wrong with it. */
interface Desk {
  path: string;
  sheet: Sheet;
  file: SheetFile<Sheet>;
  issues: { line: number; message: string }[];
  dimensions: Map<string, Dimension>;
}

/** Draws tried when a sheet is published; enough to find a range that cannot be solved. */
const TRIAL_DRAWS = 12;

/**
 * Reads a question sheet, checks it whole and turns it into the form that is kept:
 * schema, names, units, bounds, and a dozen trial draws.
 *
 * @throws {SheetInvalid} naming the file and the line of everything that is wrong.
 */
export function parseQuestion(source: string, path: string): CompiledQuestion {
  const file = openSheet(source, path, sheetSchema);
  const desk: Desk = { path, sheet: file.front, file, issues: [], dimensions: new Map() };
  const givens = readGivens(desk);
  const steps = readSteps(desk, givens);
  const require = desk.sheet.require.flatMap((text, index) =>
    attempt(desk, ['require', index], () => conditionIn(text, desk.dimensions)),
  );
  const parts = readParts(desk, givens, steps);
  const slips = desk.sheet.slips.flatMap((slip, index) =>
    attempt(desk, ['slips', index], () =>
      readSlip(slip, { parts, steps, dimensions: desk.dimensions }),
    ),
  );
  const [curve = null] = attempt(desk, ['curve'], () =>
    desk.sheet.curve ? planCurve(desk.sheet.curve, givens) : null,
  );
  checkWords(desk, givens);
  stopIfWrong(desk);
  const question: Compiled = {
    formatVersion: FORMAT_VERSION,
    meta: metaOf(desk.sheet, parts),
    profile: desk.sheet.profile,
    aids: desk.sheet.aids,
    cautions: desk.sheet.cautions,
    ...leadAndBody(file.intro),
    givens,
    steps,
    require,
    parts,
    slips,
    diagram: diagramOf(desk.sheet.diagram),
    curve,
  };
  attempt(desk, ['given'], () => tryDraws(question));
  stopIfWrong(desk);
  return question;
}

/** Runs one check; what it throws becomes an issue at the field's line. */
function attempt<T>(desk: Desk, field: PropertyKey[], check: () => T): T[] {
  try {
    return [check()];
  } catch (error) {
    const message = error instanceof Error ? error.message : String(error);
    desk.issues.push({
      line: desk.file.lineOf(field),
      message: `${field.join(' › ')}: ${message}`,
    });
    return [];
  }
}

function stopIfWrong(desk: Desk): void {
  if (desk.issues.length === 0) return;
  throw new SheetInvalid(
    desk.path,
    desk.issues.toSorted((a, b) => a.line - b.line),
  );
}

function declare(desk: Desk, name: string, dimension: Dimension): void {
  const refusal =
    refusalOf(name) ?? (desk.dimensions.has(name) ? `Name "${name}" is declared twice.` : null);
  if (refusal) throw new Error(refusal);
  desk.dimensions.set(name, dimension);
}

function readGivens(desk: Desk): Given[] {
  return Object.entries(desk.sheet.given).flatMap(([name, entry]) =>
    attempt(desk, ['given', name], () => {
      const given = readGiven(name, entry);
      declare(desk, name, given.unit.dimension);
      return given;
    }),
  );
}

/** Curve readings first: sums may lean on them, never the other way. */
function readSteps(desk: Desk, givens: readonly Given[]): Step[] {
  const curve = desk.sheet.curve;
  const reads = Object.entries(curve?.reads ?? {}).flatMap(([name, entry]) =>
    attempt(desk, ['curve', 'reads', name], (): Step => {
      const { at, of: kind, because, ...rest } = entry;
      const needsTime = kind.endsWith(' at');
      if (needsTime !== (at !== undefined) || (at && !givens.some((g) => g.name === at))) {
        throw new Error('A reading "… at" names the given that holds its time, others name none.');
      }
      const unit = parseUnit(rest.unit);
      declare(desk, name, unit.dimension);
      const read = (needsTime ? { kind, at } : { kind }) as Extract<
        Step['how'],
        { kind: 'read' }
      >['read'];
      return { ...rest, name, unit, how: { kind: 'read', read, because } };
    }),
  );
  const sums = Object.entries(desk.sheet.steps).flatMap(([name, entry]) =>
    attempt(desk, ['steps', name], () => readSum(desk, name, entry)),
  );
  return [...reads, ...sums];
}

function readSum(desk: Desk, name: string, entry: Sheet['steps'][string]): Step {
  const expr = readExpression(entry.is, new Set(desk.dimensions.keys()));
  const unit = parseUnit(entry.unit);
  // Declared even when its sum is wrong, so that one mistake is not reported at every later line.
  declare(desk, name, unit.dimension);
  if (!sameDimension(dimensionOf(expr, desk.dimensions), unit.dimension)) {
    throw new Error(`The sum does not come out in ${unit.symbol || 'a pure number'}; check it.`);
  }
  return { name, symbol: entry.symbol, unit, figures: entry.figures, how: { kind: 'sum', expr } };
}

function conditionIn(text: string, dimensions: ReadonlyMap<string, Dimension>): Expr {
  const expr = readExpression(text, new Set(dimensions.keys()));
  if (outcomeOf(expr, dimensions).kind === 'condition') return expr;
  throw new Error(`"${text}" is not a comparison; write one like share > 0.01.`);
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
  const words: [PropertyKey[], unknown][] = [
    [[], [desk.file.intro, desk.file.sections.map((section) => section.text)]],
    [['ask'], desk.sheet.ask],
    [['slips'], desk.sheet.slips],
    [['diagram'], desk.sheet.diagram],
  ];
  for (const [field, texts] of words) {
    for (const name of misnamedIn(texts, names)) {
      desk.issues.push({
        line: desk.file.lineOf(field),
        message: `{${name}} names no shown value; use one of ${[...names].join(', ')}.`,
      });
    }
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

function tryDraws(question: Compiled): void {
  for (let trial = 1; trial <= TRIAL_DRAWS; trial += 1) {
    drawQuestion(question, trial.toString(16).padStart(64, '0'));
  }
}

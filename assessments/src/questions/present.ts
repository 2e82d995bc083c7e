import {
  type Compiled,
  type Drawn,
  type DrawnPart,
  openDrawn,
  openQuestion,
  type Part,
} from './compiled.ts';
import { figureText } from './format.ts';
import { fillIn, shownFigure } from './placeholders.ts';
import {
  type CompiledQuestion,
  type DiagramView,
  type DrawnQuestion,
  type GivenView,
  type OptionView,
  type PartView,
  type QuestionView,
  type TableView,
} from './types.ts';

/** Enough to print a figure whole. */
const WHOLE = 9;

/** What a person may see before marking: built field by field, so that nothing else slips in. */
export function presentQuestion(stored: CompiledQuestion, drawing: DrawnQuestion): QuestionView {
  const question = openQuestion(stored);
  const drawn = openDrawn(question, drawing);
  return {
    title: question.meta.title,
    lead: fillIn(question.lead, question.givens, drawn.values),
    body: fillIn(question.body, question.givens, drawn.values),
    subject: question.meta.subject,
    profile: question.profile,
    marks: question.meta.marks,
    aids: question.aids,
    given: presentGivens(question, drawn),
    tables: presentTables(question),
    diagram: presentDiagram(question, drawn),
    curve: drawn.curve,
    cautions: question.cautions,
    parts: question.parts.map((part) => presentPart(question, drawn, part)),
  };
}

export function presentGivens(question: Compiled, drawn: Drawn): GivenView[] {
  return question.givens
    .filter((given) => given.isShown)
    .map((given) => ({
      symbol: given.symbol,
      label: given.label,
      value: shownFigure(given, drawn.values[given.name] ?? NaN),
      unit: given.unit.symbol,
    }));
}

/** Table extracts as they are printed; an empty cell is a dash. */
export function presentTables({ tables }: Compiled): TableView[] {
  return tables.map(({ caption, source, columns, rows }) => ({
    caption,
    source,
    columns: columns.map(({ label, unit }) => ({ label, unit: unit.symbol })),
    rows: rows.map((cells) =>
      cells.map((cell, place) => {
        const unit = columns[place]?.unit;
        return cell === null || !unit ? '–' : figureText(cell, unit, WHOLE);
      }),
    ),
  }));
}

export function presentDiagram(question: Compiled, drawn: Drawn): DiagramView | null {
  if (!question.diagram) return null;
  const { kind, labels, load } = question.diagram;
  const fill = (text: string): string => fillIn(text, question.givens, drawn.values);
  return {
    kind,
    load,
    labels: {
      source: fill(labels.source),
      fuse: fill(labels.fuse),
      load: fill(labels.load),
      loadNote: fill(labels.loadNote),
      cable: fill(labels.cable),
      length: fill(labels.length),
    },
  };
}

function presentPart(question: Compiled, drawn: Drawn, part: Part): PartView {
  const step = 'step' in part ? question.steps.find((one) => one.name === part.step) : undefined;
  return {
    id: part.id,
    kind: part.kind === 'size' ? 'choice' : part.kind,
    prompt: fillIn(part.prompt, question.givens, drawn.values),
    marks: part.marks,
    symbol: step?.symbol ?? null,
    units: part.kind === 'quantity' ? part.units.map((unit) => unit.symbol) : [],
    rounding: part.kind === 'quantity' ? (part.rounding?.text ?? null) : null,
    options: presentOptions(question, drawn, part),
    rows: presentRows(question, drawn, part),
    layout: part.kind === 'size' ? 'sizes' : 'rows',
  };
}

function presentOptions(question: Compiled, drawn: Drawn, part: Part): OptionView[] {
  const held: DrawnPart | undefined = drawn.parts[part.id];
  if (!held || held.kind === 'quantity') return [];
  return held.options.map(({ id, index }) => ({
    id,
    text: fillIn(optionText(part, index), question.givens, drawn.values),
  }));
}

function presentRows(question: Compiled, drawn: Drawn, part: Part): OptionView[] {
  const held: DrawnPart | undefined = drawn.parts[part.id];
  if (held?.kind !== 'match' || part.kind !== 'match') return [];
  return held.rows.map(({ id, index }) => ({
    id,
    text: fillIn(part.rows[index]?.text ?? '', question.givens, drawn.values),
  }));
}

/** What an option says; of a size, its figure and unit. */
export function optionText(part: Part, index: number): string {
  switch (part.kind) {
    case 'quantity':
      return '';
    case 'size':
      return `${figureText(part.sizes[index] ?? NaN, part.unit, WHOLE)} ${part.unit.symbol}`;
    case 'order':
      return part.items[index] ?? '';
    case 'match':
      return part.options[index] ?? '';
    default:
      return part.options[index]?.text ?? '';
  }
}

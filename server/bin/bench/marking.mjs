import { readFileSync } from 'node:fs';
import { drawQuestion, keyAnswers, markQuestion, parseQuestion } from '@ferrule/assessments';
import { all, create } from 'mathjs';
import { parse } from 'yaml';
import { fromRoot } from '../steps/paths.mjs';
import { compare, repeated } from './rounds.mjs';

const sheetFile = 'assessments/bank/voltage-drop/vd-chart-table.md';
const seed = '5eed'.repeat(16);
const rounds = 15;
const turn = { milliseconds: 30, batch: 20 };
/** As the library's own list has them; the question needs no larger. */
const cableAreasMm2 = [1.5, 2.5, 4, 6, 10, 16, 25, 35, 50];
/** How mathjs spells the SI units of the values this question is given. */
const mathUnits = { V: 'V', A: 'A', m: 'm', 'mm²': 'm^2', 'Ω·mm²/m': 'ohm m', '%': null };

const readSheet = (source) => parse(source.split(/^---$/m)[1]);

function unitOf(given) {
  const figure = String(given.value ?? given.from);
  return given.stock ? 'mm²' : figure.slice(figure.indexOf(' ') + 1);
}

/** The givens as mathjs has them, with units. */
function givenScope(math, sheet, drawn) {
  const entries = Object.entries(sheet.given).map(([name, given]) => {
    const unit = mathUnits[unitOf(given)];
    if (unit === undefined) throw new Error(`${name} is in a unit the bench does not know.`);
    const si = drawn.values[name];
    return [name, unit === null ? si : math.unit(si, unit)];
  });
  return new Map(entries);
}

function mathWithStockSizes() {
  const math = create(all);
  const nextCable = (area) => {
    const atLeast = area.toNumber('mm^2') * (1 - 1e-9);
    return math.unit(
      cableAreasMm2.find((size) => size >= atLeast),
      'mm^2',
    );
  };
  math.import({ nextCable });
  return math;
}

const siOf = (value) => (typeof value === 'number' ? value : value.toSI().toNumber());

/** Both sides must come to the same values, or the comparison says nothing. */
function requireSameValues(scope, drawn) {
  for (const [name, value] of scope) {
    const wanted = drawn.values[name];
    if (Math.abs(siOf(value) / wanted - 1) < 1e-6) continue;
    throw new Error(`mathjs finds ${value} for ${name}, the question ${wanted} (SI).`);
  }
}

/** Evaluates every step once, with units; the expressions are compiled beforehand. */
function bareEvaluation(sheet, drawn) {
  const math = mathWithStockSizes();
  const steps = Object.entries(sheet.steps).map(([name, { is }]) => [name, math.compile(is)]);
  const givens = givenScope(math, sheet, drawn);
  const evaluate = () => {
    const scope = new Map(givens);
    for (const [name, compiled] of steps) scope.set(name, compiled.evaluate(scope));
    return scope;
  };
  requireSameValues(evaluate(), drawn);
  return evaluate;
}

function requireVerdicts(marked, wanted) {
  const found = marked.parts.map(({ verdict }) => verdict).join(', ');
  if (found !== wanted) throw new Error(`The bench's answers were marked ${found}, not ${wanted}.`);
}

/** Marking one answered question against mathjs working its steps with units. */
export async function measureMarking({ signal }) {
  const source = readFileSync(fromRoot(sheetFile), 'utf8');
  // As the server holds it: compiled, stored as JSON and read back.
  const question = JSON.parse(JSON.stringify(parseQuestion(source, sheetFile)));
  const drawn = JSON.parse(JSON.stringify(drawQuestion(question, seed)));
  const right = keyAnswers(question, drawn);
  const slipped = keyAnswers(question, drawn, ['a']);
  requireVerdicts(markQuestion(question, drawn, right), 'right, right, right, right');
  const evaluate = bareEvaluation(readSheet(source), drawn);
  const bare = repeated(evaluate, turn);
  const against = (answers) =>
    compare({
      ours: repeated(() => markQuestion(question, drawn, answers), turn),
      ...{ rounds, bare, signal },
    });
  return [
    { what: 'Marking, all four parts right', ...(await against(right)).processor },
    { what: 'Marking, a slip in the first part', ...(await against(slipped)).processor },
  ];
}

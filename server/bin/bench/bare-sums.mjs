import { all, create } from 'mathjs';
import { parse } from 'yaml';
import { fromRoot } from '../steps/paths.mjs';

const { FUNCTIONS } = await import(fromRoot('assessments', 'dist', 'questions', 'functions.js'));
const { PROFILES } = await import(
  fromRoot('assessments', 'dist', 'electrical', 'practice-profile.js')
);

/** How mathjs spells a dimension (kg, m, s, A, K): in the fewest units, as a person would. */
const mathUnits = new Map([
  ['0,0,0,0,0', null],
  ['1,2,-3,-1,0', 'V'],
  ['0,0,0,1,0', 'A'],
  ['1,2,-3,-2,0', 'ohm'],
  ['1,2,-3,0,0', 'W'],
  ['1,2,-2,0,0', 'J'],
  ['0,0,1,1,0', 'C'],
  ['-1,-2,4,2,0', 'F'],
  ['0,1,0,0,0', 'm'],
  ['0,2,0,0,0', 'm^2'],
  ['0,3,0,0,0', 'm^3'],
  ['0,0,1,0,0', 's'],
  ['0,0,0,0,1', 'K'],
  ['1,0,0,0,0', 'kg'],
  ['1,1,-2,0,0', 'N'],
  ['1,3,-3,-2,0', 'ohm m'],
  ['1,1,-3,-2,0', 'ohm / m'],
  ['1,0,-3,0,0', 'W / m^2'],
]);
const baseUnits = ['kg', 'm', 's', 'A', 'K'];
const mathNames = { ln: 'log' };

function unitOf(dimension) {
  const known = mathUnits.get(dimension.join());
  if (known !== undefined) return known;
  return dimension
    .flatMap((power, at) => (power === 0 ? [] : `${baseUnits[at]}^${power}`))
    .join(' ');
}

/** A function of arguments of stated dimensions, over units. */
function ofKinds(math, shape, work) {
  const gives = unitOf(shape.gives);
  const takes = shape.takes.map(unitOf);
  const toPlain = (value, at) => (takes[at] ? value.toNumber(takes[at]) : value);
  return (...args) => {
    const found = work(args.map(toPlain));
    return gives === null ? found : math.unit(found, gives);
  };
}

/** A function of arguments that are all alike, over units. */
function ofOneKind(math, work) {
  return (...args) => {
    if (typeof args[0] === 'number') return work(args);
    const unit = args[0].toSI().formatUnits();
    return math.unit(work(args.map((value) => value.toNumber(unit))), unit);
  };
}

/** A mathjs with the trade's functions, which take and give units. */
function mathOfTheTrade(profile) {
  const math = create(all);
  const functions = {};
  for (const [name, { run, shape }] of FUNCTIONS) {
    if (name in math) continue;
    const work = (args) => run(args, profile);
    functions[name] = shape.kind === 'fixed' ? ofKinds(math, shape, work) : ofOneKind(math, work);
  }
  for (const [ours, theirs] of Object.entries(mathNames)) functions[ours] = math[theirs];
  math.import(functions);
  return math;
}

const maths = Object.fromEntries(
  Object.entries(PROFILES).map(([name, profile]) => [name, mathOfTheTrade(profile)]),
);

const siOf = (value) => (typeof value === 'number' ? value : value.toSI().toNumber());
const isSum = (text) => typeof text === 'string' || typeof text === 'number';

/** Whether mathjs can work a sheet: sums only, nothing read off a curve or out of a table. */
function hasOnlySums(sheet) {
  const made = (sheet.slips ?? []).flatMap(({ makes }) => Object.values(makes));
  const steps = Object.values(sheet.steps ?? {});
  const plain = steps.length > 0 && steps.every(({ is }) => isSum(is)) && made.every(isSum);
  // Between round() and other functions of both, only the library's meaning is meant.
  return plain && !sheet.curve && !/\bround\(/.test(JSON.stringify([sheet.steps, sheet.slips]));
}

const namesIn = (text) => new Set(String(text).match(/[a-z][A-Za-z0-9]*/g) ?? []);

/** Steps that lean on the step of the first part, which was answered with a slip. */
function stepsAfter(first, steps) {
  const later = new Set([first]);
  for (const [name, { is }] of Object.entries(steps)) {
    if ([...namesIn(is)].some((one) => later.has(one))) later.add(name);
  }
  later.delete(first);
  return later;
}

/** Both sides must come to the same values, or the comparison says nothing. */
function requireSame(scope, { values, slug }) {
  for (const [name, value] of scope) {
    const wanted = values[name];
    const found = siOf(value);
    if (found === wanted || Math.abs(found / wanted - 1) < 1e-6) continue;
    throw new Error(`${slug}: mathjs finds ${value} for ${name}, the question ${wanted} (SI).`);
  }
}

/**
 * A question's sums worked by mathjs with units, compiled beforehand: `draw` works what a draw
 * needs once (conditions, steps, slips of what is asked), `judgeSlip` the steps and slips that a
 * first part answered with a slip has worked again; null where mathjs cannot work the sheet.
 */
export function bareSums({ source, question, drawn }) {
  const sheet = parse(source.split(/^---$/m)[1]);
  if (!hasOnlySums(sheet)) return null;
  const math = maths[sheet.profile];
  const compiled = (entries) => entries.map(([name, text]) => [name, math.compile(String(text))]);
  const asked = Object.values(sheet.ask).map((ask) => ask.find ?? ask.size);
  const slips = (sheet.slips ?? []).flatMap(({ makes }) => Object.entries(makes));
  const steps = Object.entries(sheet.steps).map(([name, { is }]) => [name, is]);
  const after = stepsAfter(asked.find(Boolean), sheet.steps);
  const sums = {
    givens: question.givens.map(({ name, unit }) => {
      const spelt = unitOf(unit.dimension);
      const si = drawn.values[name];
      return [name, spelt === null ? si : math.unit(si, spelt)];
    }),
    conditions: (sheet.require ?? []).map((text) => math.compile(String(text))),
    steps: compiled(steps),
    slips: compiled(slips.filter(([step]) => asked.includes(step))),
    stepsAfter: compiled(steps.filter(([name]) => after.has(name))),
    slipsAfter: compiled(slips.filter(([name]) => after.has(name) && asked.includes(name))),
  };
  const draw = () => workAll(sums);
  const scope = draw();
  requireSame(scope, drawn);
  return { draw, judgeSlip: () => workAgain(sums, scope) };
}

function workSlips(slips, scope) {
  for (const [, slip] of slips) {
    try {
      slip.evaluate(scope);
    } catch {
      // Out of some table: silent on both sides.
    }
  }
}

function workAll({ givens, conditions, steps, slips }) {
  const scope = new Map(givens);
  for (const [name, step] of steps) scope.set(name, step.evaluate(scope));
  for (const condition of conditions) condition.evaluate(scope);
  workSlips(slips, scope);
  return scope;
}

function workAgain({ stepsAfter: steps, slipsAfter }, known) {
  const scope = new Map(known);
  for (const [name, step] of steps) scope.set(name, step.evaluate(scope));
  workSlips(slipsAfter, scope);
  return scope;
}

import { type Given } from './compiled.ts';
import { figureText, toFigures, toShortFigures } from './format.ts';
import { fromSi } from './units.ts';

const PLACEHOLDER = /\{([a-z][A-Za-z0-9]*)\}/g;
const NO_BREAK = '\u00a0';
/** Enough to print a drawn figure whole. */
const WHOLE = 9;

/** A given's figure as it stands in the table of given values. */
export function shownFigure(given: Given, si: number): string {
  const figure = fromSi(si, given.unit);
  return given.figures === null
    ? figureText(figure, given.unit, WHOLE)
    : longer(toFigures(figure, given.figures), toShortFigures(figure, WHOLE));
}

/** Rounding may never hide digits that were drawn: 0.0175 stays, 128.5 stays. */
function longer(rounded: string, exact: string): string {
  return Number(rounded.replace('\u2212', '-')) === Number(exact.replace('\u2212', '-'))
    ? rounded
    : exact;
}

/** Puts drawn values in the place of {names}. */
export function fillIn(
  text: string,
  givens: readonly Given[],
  values: Record<string, number>,
): string {
  return text.replace(PLACEHOLDER, (whole, name: string) => {
    const given = givens.find((one) => one.name === name);
    const value = values[name];
    if (!given || value === undefined) return whole;
    const figure = figureText(fromSi(value, given.unit), given.unit, WHOLE);
    return given.unit.symbol === '' ? figure : figure + NO_BREAK + given.unit.symbol;
  });
}

/** Placeholders anywhere in the texts that name nothing shown. */
export function misnamedIn(texts: unknown, names: ReadonlySet<string>): string[] {
  const found = JSON.stringify(texts ?? '').matchAll(PLACEHOLDER);
  return [...new Set([...found].map((match) => match[1] ?? ''))].filter((name) => !names.has(name));
}

import { StatementTooLong } from '../errors.ts';
import { type Pen, type TypeStyle } from './pen.ts';

export interface SetLines {
  lines: string[];
  style: TypeStyle;
}

/** Breaks at spaces, filling each line; a word wider than the line stands alone on it. */
export function wrap(
  pen: Pen,
  text: string,
  setting: { style: TypeStyle; width: number },
): string[] {
  const lines: string[] = [];
  for (const word of text.split(' ')) {
    const last = lines.at(-1);
    const longer = last === undefined ? word : `${last} ${word}`;
    if (last !== undefined && pen.widthOf(longer, setting.style) <= setting.width) {
      lines[lines.length - 1] = longer;
    } else {
      lines.push(word);
    }
  }
  return lines;
}

/** Breaks into as few lines as `wrap` does, but of even length. */
export function wrapEvenly(
  pen: Pen,
  text: string,
  setting: { style: TypeStyle; width: number },
): string[] {
  let best = wrap(pen, text, setting);
  if (best.length === 1) return best;
  for (let width = setting.width - 10; width > setting.width / 3; width -= 10) {
    const narrower = wrap(pen, text, { ...setting, width });
    const fits = narrower.every((line) => pen.widthOf(line, setting.style) <= width);
    if (!fits || narrower.length > best.length) break;
    best = narrower;
  }
  return best;
}

export interface Fitting {
  /** Names the text in the error when nothing fits. */
  what: string;
  style: TypeStyle;
  width: number;
  /** The smallest size on one line; below it the text takes two. */
  oneLineFrom: number;
  smallest: number;
}

/**
 * As large as the width allows, on one line or, once that is too small, evenly on two.
 *
 * @throws {StatementTooLong} when even two lines of the smallest size are too narrow.
 */
export function fitTwoLines(pen: Pen, text: string, fitting: Fitting): SetLines {
  const single = sized(pen, [text], fitting);
  if (single.style.size >= fitting.oneLineFrom) return single;
  const pairs = breaks(text).map((lines) => sized(pen, lines, fitting));
  const best = pairs.reduce(
    (one, other) => (other.style.size > one.style.size ? other : one),
    single,
  );
  const size = Math.min(best.style.size, best === single ? Infinity : fitting.oneLineFrom);
  if (size < fitting.smallest) {
    throw new StatementTooLong(
      `The ${fitting.what} “${text}” is too long for the certificate: at the smallest readable size ` +
        'two lines do not hold it. Shorten it.',
    );
  }
  return { lines: best.lines, style: { ...best.style, size } };
}

/** The text at the largest size, up to the style's own, at which every line fits. */
function sized(pen: Pen, lines: string[], { style, width }: Fitting): SetLines {
  const widest = Math.max(...lines.map((line) => pen.widthOf(line, style)));
  const size = Math.min(style.size, (style.size * width) / widest);
  return { lines, style: { ...style, size: Math.floor(size * 4) / 4 } };
}

/** Every way to break a text in two: at a space, or after a hyphen. */
function breaks(text: string): string[][] {
  return [...text.matchAll(/[ -]/g)].map(({ index }) => [
    text.slice(0, index + 1).trimEnd(),
    text.slice(index + 1),
  ]);
}

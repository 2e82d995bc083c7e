/** A piece of plain text with the places where something was found. */
export interface Snippet {
  readonly text: string;
  readonly marks: { readonly from: number; readonly to: number }[];
}

/** Signs PostgreSQL is told to set around a find; they are removed from every text beforehand. */
export const OPEN = '\ue000';
export const CLOSE = '\ue001';

const LEFT_OUT = '…';

/**
 * Takes the signs out of a headline and says where they stood. Where it is cut out of a longer
 * text, an ellipsis says so.
 */
export function readSnippet(
  headline: string,
  whole: { opening: string; closing: string },
): Snippet {
  const { text, marks } = readMarks(headline.trim());
  const before = text.startsWith(whole.opening.trim()) ? '' : `${LEFT_OUT} `;
  const after = text.endsWith(whole.closing.trim()) ? '' : ` ${LEFT_OUT}`;
  const shift = before.length;
  return {
    text: `${before}${text}${after}`,
    marks: marks.map(({ from, to }) => ({ from: from + shift, to: to + shift })),
  };
}

function readMarks(headline: string): Snippet {
  const marks: { from: number; to: number }[] = [];
  let text = '';
  let from: number | null = null;
  for (const sign of headline) {
    if (sign === OPEN) from = text.length;
    else if (sign === CLOSE && from !== null) {
      marks.push({ from, to: text.length });
      from = null;
    } else text += sign;
  }
  return { text, marks };
}

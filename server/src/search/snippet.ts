/** A piece of plain text with the places where something was found. */
export interface Snippet {
  readonly text: string;
  readonly marks: { readonly from: number; readonly to: number }[];
}

/** Signs PostgreSQL is told to set around a find; they are removed from every text beforehand. */
export const OPEN = '\ue000';
export const CLOSE = '\ue001';

/** Takes the signs out of a headline and says where they stood. */
export function readSnippet(headline: string): Snippet {
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

import { type CertificateStatement } from '../certificate.ts';
import { fitTwoLines, type SetLines } from './fit.ts';
import { inks, type Pen, type TypeStyle } from './pen.ts';
import { drawMark, frame } from './sheet.ts';
import { type Element } from './structure.ts';

const italic: TypeStyle = { face: 'textItalic', size: 18, ink: inks.second };
const nameStyle: TypeStyle = { face: 'textBold', size: 62, ink: inks.main, tracking: -25 };
const titleStyle: TypeStyle = { face: 'textBold', size: 33, ink: inks.copperText, tracking: -15 };
const wordmarkStyle: TypeStyle = { face: 'textBold', size: 22, ink: inks.main };
const issuerStyle: TypeStyle = { face: 'text', size: 16, ink: inks.main };

/** As wide as centred text may be. */
export const textWidth = 600;

/** Wordmark and certifying body, along the top of the frame. */
export function drawHead(pen: Pen, { issuer }: CertificateStatement): Element {
  drawMark(pen, frame.left + 32, frame.top + 23);
  const name = fitTwoLines(pen, issuer.name, {
    what: 'name of the certifying body',
    style: issuerStyle,
    width: 440,
    oneLineFrom: 12,
    smallest: 10,
  });
  const markedContent = pen.tagged('P', () => {
    pen.text('Ferrule', wordmarkStyle, { x: frame.left + 86, y: frame.top + 41 });
    for (const [index, line] of name.lines.entries()) {
      const y = frame.top + 39 + index * name.style.size * 1.35;
      pen.text(line, name.style, { x: frame.right - 32, y, align: 'right' });
    }
  });
  return { role: 'P', markedContent };
}

/** Whom it is about and what they are certified as; the name as large as it can be. */
export function drawHolder(
  pen: Pen,
  statement: CertificateStatement,
): { elements: Element[]; bottom: number } {
  const name = fitName(pen, statement.holderName);
  const title = fitTwoLines(pen, statement.scheme.title, {
    what: 'title of the scheme',
    style: titleStyle,
    width: textWidth,
    oneLineFrom: 22,
    smallest: 16,
  });
  const opening = { lines: ['This certifies that'], style: italic };
  const passed = {
    lines: ['has passed the certification paper and is certified as'],
    style: italic,
  };

  let y = 142;
  const elements = [drawCentred(pen, 'P', { ...opening, y })];
  y += 28 + name.style.size * (name.lines.length === 1 ? 0.82 : 0.95);
  elements.push(drawCentred(pen, 'H1', { ...name, y }));
  y += (name.lines.length - 1) * lineHeight(name) + 24 + name.style.size * 0.37;
  elements.push(drawCentred(pen, 'P', { ...passed, y }));
  y += 23 + title.style.size;
  elements.push(drawCentred(pen, 'H2', { ...title, y }));
  return { elements, bottom: y + (title.lines.length - 1) * lineHeight(title) };
}

/** @throws {StatementTooLong} when two lines do not hold the name. */
export function fitName(pen: Pen, holderName: string): SetLines {
  return fitTwoLines(pen, holderName, {
    what: 'holder’s name',
    style: nameStyle,
    width: textWidth,
    oneLineFrom: 44,
    smallest: 20,
  });
}

function lineHeight({ style }: SetLines): number {
  return style.size * 1.16;
}

function drawCentred(pen: Pen, role: Element['role'], text: SetLines & { y: number }): Element {
  const markedContent = pen.tagged(role, () => {
    for (const [index, line] of text.lines.entries()) {
      const y = text.y + index * lineHeight(text);
      pen.text(line, text.style, { x: frame.middle, y, align: 'middle' });
    }
  });
  return { role, markedContent };
}

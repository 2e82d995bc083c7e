import { type CertificateStatement } from '../certificate.ts';
import { fitTwoLines, wrap } from './fit.ts';
import { inks, type Pen, type TypeStyle } from './pen.ts';
import { drawQrCode } from './qr.ts';
import { frame } from './sheet.ts';
import { type Element } from './structure.ts';

const blockWidth = 372;
const rowHeights = [44, 44, 44, 60];
const left = frame.right - blockWidth;

/** Where the lowest part of the sheet begins. */
export const footTop = frame.bottom - rowHeights.reduce((sum, height) => sum + height, 0);

const labelStyle: TypeStyle = { face: 'data', size: 11, ink: inks.label };
const valueStyle: TypeStyle = { face: 'dataBold', size: 14, ink: inks.main };
const numberStyle: TypeStyle = { face: 'number', size: 14, ink: inks.main };
const noteStyle: TypeStyle = { face: 'data', size: 13, ink: inks.second };
const rule = { width: 1, ink: inks.line };

interface Cell {
  label: string;
  value: string;
  style?: TypeStyle;
  note?: string;
  /** Of the block's six columns. */
  span: number;
}

/** Title block (ISO 7200) at the bottom right, code and what to do with it at the left. */
export function drawFoot(pen: Pen, statement: CertificateStatement): Element[] {
  pen.artifact(() => {
    pen.line([frame.left, footTop], [frame.right, footTop], { width: 2, ink: inks.line });
    pen.line([left, footTop], [left, frame.bottom], { width: 2, ink: inks.line });
  });
  return [...drawCheck(pen, statement), ...drawTitleBlock(pen, statement)];
}

function cellsOf(statement: CertificateStatement): Cell[][] {
  const { scheme, issuer } = statement;
  return [
    [
      { label: 'Certificate no.', value: statement.number, style: numberStyle, span: 4 },
      { label: 'Sheet', value: '1 of 1', span: 2 },
    ],
    [
      { label: 'Issued', value: longDate(statement.issuedOn), span: 3 },
      { label: 'Expires', value: longDate(statement.expiresOn), span: 3 },
    ],
    [
      { label: 'Scheme', value: scheme.slug, span: 4 },
      { label: 'Revision', value: scheme.revision, span: 2 },
    ],
    [{ label: 'Certifying body', value: issuer.name, note: issuer.address, span: 6 }],
  ];
}

function drawTitleBlock(pen: Pen, statement: CertificateStatement): Element[] {
  const elements: Element[] = [];
  let y = footTop;
  for (const [index, cells] of cellsOf(statement).entries()) {
    if (index > 0) pen.artifact(() => pen.line([left, y], [frame.right, y], rule));
    let x = left;
    const height = rowHeights[index] ?? 0;
    for (const cell of cells) {
      const cellLeft = x;
      if (cellLeft > left) {
        pen.artifact(() => pen.line([cellLeft, y], [cellLeft, y + height], rule));
      }
      elements.push(drawCell(pen, cell, { x: cellLeft, y }));
      x += (blockWidth / 6) * cell.span;
    }
    y += height;
  }
  return elements;
}

function drawCell(pen: Pen, cell: Cell, corner: { x: number; y: number }): Element {
  const x = corner.x + 13;
  const width = (blockWidth / 6) * cell.span - 24;
  const value = fitTwoLines(pen, cell.value, {
    what: cell.label.toLowerCase(),
    style: cell.style ?? valueStyle,
    width,
    oneLineFrom: 6,
    smallest: 6,
  });
  const markedContent = pen.tagged('P', () => {
    pen.text(cell.label, labelStyle, { x, y: corner.y + 16 });
    pen.text(value.lines.join(' '), value.style, { x, y: corner.y + 33 });
    if (cell.note === undefined) return;
    const note = fitTwoLines(pen, cell.note, {
      what: `${cell.label.toLowerCase()}’s address`,
      style: { ...noteStyle, size: 12 },
      width,
      oneLineFrom: 6,
      smallest: 6,
    });
    pen.text(note.lines.join(' '), note.style, { x, y: corner.y + 50 });
  });
  return { role: 'P', markedContent };
}

function drawCheck(pen: Pen, statement: CertificateStatement): Element[] {
  const side = 124;
  const inset = (frame.bottom - footTop - side) / 2;
  const code = { x: frame.left + inset, y: footTop + inset, side };
  const figure = pen.tagged('Figure', () => drawQrCode(pen, statement.registerUrl, code));

  const x = code.x + side + 20;
  const width = left - x - 12;
  const page = fitTwoLines(pen, statement.registerPage, {
    what: 'register address',
    style: { ...valueStyle, size: 13 },
    width,
    oneLineFrom: 6,
    smallest: 6,
  });
  const proof = wrap(
    pen,
    'The register and the signature in the file are the proof; the strand mark only helps the eye.',
    { style: noteStyle, width },
  );
  const lines: [string, TypeStyle][] = [
    ['Check this certificate at', noteStyle],
    [page.lines.join(' '), page.style],
    ['or with this code.', noteStyle],
    ...proof.map((line): [string, TypeStyle] => [line, noteStyle]),
  ];
  const lineHeight = 18;
  const gap = 7;
  const top = (footTop + frame.bottom - lines.length * lineHeight - gap) / 2 + 13;
  const text = pen.tagged('P', () => {
    for (const [index, [line, style]] of lines.entries()) {
      pen.text(line, style, { x, y: top + index * lineHeight + (index > 2 ? gap : 0) });
    }
  });
  return [
    {
      role: 'Figure',
      markedContent: figure,
      alternative: `Code that opens the register page of this certificate: ${statement.registerUrl}`,
    },
    { role: 'P', markedContent: text },
  ];
}

const months =
  'January February March April May June July August September October November December'.split(
    ' ',
  );

/** 2026-11-03 as 3 November 2026. */
function longDate(date: string): string {
  const [year, month, day] = date.split('-').map(Number);
  return `${day} ${months[(month ?? 0) - 1]} ${year}`;
}

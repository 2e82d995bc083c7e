import { type CertificateStatement } from '../certificate.ts';
import { StatementTooLong } from '../errors.ts';
import { strandPattern } from '../strand-pattern.ts';
import { wrap, wrapEvenly } from './fit.ts';
import { textWidth } from './holder.ts';
import { inks, type Pen, type TypeStyle } from './pen.ts';
import { drawRing, drawStrandMark } from './ring.ts';
import { frame } from './sheet.ts';
import { type Element } from './structure.ts';
import { footTop } from './title-block.ts';

/** The text gives way step by step until the ring between has at least its least radius. */
const textScales = [1, 0.93, 0.87, 0.8, 0.74];
const ringRadius = { most: 182, least: 108 };
const ringGap = 16;

const scopeStyle: TypeStyle = { face: 'text', size: 15, ink: inks.second };
const blockLabelStyle: TypeStyle = { face: 'dataBold', size: 15, ink: inks.main };
const blockStyle: TypeStyle = { face: 'data', size: 14, ink: inks.second };
const blockWidth = 286;
const blockInset = 62;
const blocksBottom = footTop - 18;

interface Block {
  label: string;
  paragraphs: string[][];
}

interface Arrangement {
  scale: number;
  top: number;
  scope: string[][];
  blocks: Block[];
  blocksTop: number;
  ringRadius: number;
  ringCentre: [number, number];
}

/**
 * What was assessed, the ring, and beneath it what is not covered and how the paper was sat.
 *
 * @throws {StatementTooLong} when it does not fit at the smallest size.
 */
export function drawAssessed(pen: Pen, statement: CertificateStatement, top: number): Element[] {
  const chosen = fitArrangement(pen, statement, top);
  return [
    ...drawScope(pen, chosen),
    drawSeal(pen, chosen, statement.number),
    ...drawBlocks(pen, chosen),
  ];
}

function fitArrangement(pen: Pen, statement: CertificateStatement, top: number): Arrangement {
  for (const scale of textScales) {
    const arrangement = arrange(pen, statement, { scale, top });
    if (arrangement.ringRadius >= ringRadius.least) return arrangement;
  }
  throw new StatementTooLong(
    `Scope (${statement.scope.length} entries), limits (${statement.limits.length}) and the way of ` +
      'sitting are more than the certificate holds at a readable size. Shorten them.',
  );
}

function arrange(
  pen: Pen,
  statement: CertificateStatement,
  { scale, top }: { scale: number; top: number },
): Arrangement {
  const scope = statement.scope.map((entry) =>
    wrapEvenly(pen, entry, { style: scaled(scopeStyle, scale), width: textWidth }),
  );
  const blocks = [
    { label: 'Not covered', entries: statement.limits },
    { label: 'How it was sat', entries: [statement.howSat] },
  ]
    .filter(({ entries }) => entries.length > 0)
    .map(({ label, entries }) => ({
      label,
      paragraphs: entries.map((entry) =>
        wrap(pen, entry, { style: scaled(blockStyle, scale), width: blockWidth }),
      ),
    }));
  const blocksTop = blocksBottom - Math.max(...blocks.map((block) => blockHeight(block, scale)));
  const ringTop = top + scope.flat().length * scopeStep(scale) + ringGap;
  const room = (blocksTop - ringGap - ringTop) / 2;
  return {
    scale,
    top,
    scope,
    blocks,
    blocksTop,
    ringRadius: Math.min(room, ringRadius.most),
    ringCentre: [frame.middle, ringTop + room],
  };
}

function scaled(style: TypeStyle, scale: number): TypeStyle {
  return { ...style, size: style.size * scale };
}

function scopeStep(scale: number): number {
  return 23.5 * scale;
}

function blockStep(scale: number): number {
  return 18.5 * scale;
}

function blockHeight({ paragraphs }: Block, scale: number): number {
  const lines = paragraphs.flat().length;
  return 26 + lines * blockStep(scale) + (paragraphs.length - 1) * 3;
}

function drawScope(pen: Pen, { scope, scale, top }: Arrangement): Element[] {
  let y = top + scopeStep(scale) * 0.7;
  return scope.map((lines) => {
    const markedContent = pen.tagged('P', () => {
      for (const line of lines) {
        pen.text(line, scaled(scopeStyle, scale), { x: frame.middle, y, align: 'middle' });
        y += scopeStep(scale);
      }
    });
    return { role: 'P', markedContent };
  });
}

function drawSeal(pen: Pen, arrangement: Arrangement, number: string): Element {
  const { ringCentre: centre, ringRadius: radius } = arrangement;
  drawRing(pen, centre, radius);
  const markedContent = pen.tagged('Figure', () =>
    drawStrandMark(pen, strandPattern(number), { centre, ringRadius: radius }),
  );
  return { role: 'Figure', markedContent, alternative: `Strand mark of certificate ${number}` };
}

function drawBlocks(pen: Pen, { blocks, blocksTop, scale }: Arrangement): Element[] {
  return blocks.map((block, index) => {
    const isLast = index === blocks.length - 1;
    const x = isLast ? frame.right - blockInset - blockWidth : frame.left + blockInset;
    pen.artifact(() =>
      pen.line([x, blocksTop], [x + blockWidth, blocksTop], { width: 1, ink: inks.line }),
    );
    const markedContent = pen.tagged('P', () => {
      pen.text(block.label, blockLabelStyle, { x, y: blocksTop + 20 });
      let y = blocksTop + 22 + blockStep(scale) * 0.85;
      for (const lines of block.paragraphs) {
        for (const line of lines) {
          pen.text(line, scaled(blockStyle, scale), { x, y });
          y += blockStep(scale);
        }
        y += 3;
      }
    });
    return { role: 'P', markedContent };
  });
}

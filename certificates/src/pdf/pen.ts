import { type Face, type TypeSetter } from './fonts.ts';

/** A4 in the design's unit, 1/96 inch; y counts downwards from the top. */
export const sheetWidth = (210 / 25.4) * 96;
export const sheetHeight = (297 / 25.4) * 96;

export const inks = {
  sheet: '#FCFBF8',
  line: '#231F1A',
  main: '#231F1A',
  second: '#544C40',
  label: '#675E50',
  zone: '#BCB09B',
  copper: '#9C4F26',
  copperText: '#85401D',
} as const;

export interface TypeStyle {
  face: Face;
  size: number;
  ink: string;
  /** In thousandths of the type size. */
  tracking?: number;
}

export interface Place {
  x: number;
  /** Of the baseline. */
  y: number;
  align?: 'left' | 'middle' | 'right';
}

/** Draws with PDF operators (ISO 32000-1, annex A) and tags what it draws. */
export class Pen {
  private readonly operators: string[] = [];
  private marked = 0;

  constructor(private readonly type: TypeSetter) {}

  /** Everything drawn inside belongs to one element of the document's structure. */
  tagged(role: string, draw: () => void): number {
    const id = this.marked;
    this.marked += 1;
    this.operators.push(`/${role} <</MCID ${id}>> BDC`);
    draw();
    this.operators.push('EMC');
    return id;
  }

  /** Ornament, left out when the sheet is read aloud. */
  artifact(draw: () => void): void {
    this.operators.push('/Artifact BMC');
    draw();
    this.operators.push('EMC');
  }

  widthOf(line: string, style: TypeStyle): number {
    const tracking = (style.tracking ?? 0) * Math.max([...line].length - 1, 0);
    return ((this.type.widthOf(line, style.face) + tracking) * style.size) / 1000;
  }

  text(line: string, style: TypeStyle, place: Place): void {
    const shares = { left: 0, middle: 0.5, right: 1 };
    let x = place.x - this.widthOf(line, style) * shares[place.align ?? 'left'];
    for (const run of this.type.runs(line, style.face)) {
      this.operators.push(
        `BT /${run.face} ${num(style.size)} Tf ${rgb(style.ink)} rg`,
        `1 0 0 1 ${num(x)} ${num(sheetHeight - place.y)} Tm`,
      );
      let shown: string[] = [];
      for (const glyph of run.glyphs) {
        // A mark above or below its letter: shown on its own, raised.
        if (glyph.offsetY !== 0) shown = this.show(shown, 0);
        if (glyph.offsetX !== 0) shown.push(num(-glyph.offsetX));
        shown.push(`<${glyph.code}>`);
        if (glyph.offsetY !== 0) shown = this.show(shown, (glyph.offsetY * style.size) / 1000);
        const back = glyph.ownAdvance + glyph.offsetX - glyph.advance - (style.tracking ?? 0);
        if (Math.abs(back) > 0.005) shown.push(num(back));
        x += ((glyph.advance + (style.tracking ?? 0)) * style.size) / 1000;
      }
      this.show(shown, 0);
      this.operators.push('ET');
    }
  }

  private show(shown: string[], rise: number): string[] {
    if (shown.length > 0) this.operators.push(`${num(rise)} Ts [${shown.join(' ')}] TJ`);
    return [];
  }

  line(from: [number, number], to: [number, number], pen: { width: number; ink: string }): void {
    this.operators.push(
      `${rgb(pen.ink)} RG ${num(pen.width)} w`,
      `${point(...from)} m ${point(...to)} l S`,
    );
  }

  rectangle(box: Box, pen: { width: number; ink: string }): void {
    this.operators.push(`${rgb(pen.ink)} RG ${num(pen.width)} w ${rectangle(box)} S`);
  }

  fillRectangles(boxes: Box[], ink: string): void {
    this.operators.push(`${rgb(ink)} rg`, ...boxes.map(rectangle), 'f');
  }

  polygon(corners: [number, number][], paint: Paint): void {
    const [first, ...rest] = corners.map((corner) => point(...corner));
    this.operators.push(
      paintSetting(paint),
      `${first ?? ''} m ${rest.map((corner) => `${corner} l`).join(' ')} h ${paintOperator(paint)}`,
    );
  }

  circle(centre: [number, number], radius: number, paint: Paint): void {
    // Four Bézier arcs; 0.5523 keeps them within 0.03 % of a circle.
    const [x, y] = centre;
    const k = radius * 0.5523;
    const arc = (...points: [number, number][]): string =>
      `${points.map((each) => point(...each)).join(' ')} c`;
    this.operators.push(
      paintSetting(paint),
      `${point(x + radius, y)} m`,
      arc([x + radius, y + k], [x + k, y + radius], [x, y + radius]),
      arc([x - k, y + radius], [x - radius, y + k], [x - radius, y]),
      arc([x - radius, y - k], [x - k, y - radius], [x, y - radius]),
      arc([x + k, y - radius], [x + radius, y - k], [x + radius, y]),
      `h ${paintOperator(paint)}`,
    );
  }

  /** Draws a named form with its origin at `centre`, scaled and turned. */
  form(name: string, at: { centre: [number, number]; scale: number; turn: number }): void {
    const cos = Math.cos(at.turn) * at.scale;
    const sin = Math.sin(at.turn) * at.scale;
    const matrix = [cos, sin, -sin, cos].map((value) => value.toFixed(5)).join(' ');
    this.operators.push(`q ${matrix} ${point(...at.centre)} cm /${name} Do Q`);
  }

  contents(): string {
    return ['q 0.75 0 0 0.75 0 0 cm', ...this.operators, 'Q', ''].join('\n');
  }
}

export interface Box {
  x: number;
  y: number;
  width: number;
  height: number;
}

export interface Paint {
  fill?: string;
  stroke?: { width: number; ink: string };
}

/** A number as PDF writes it. */
export function num(value: number): string {
  const text = value.toFixed(2).replace(/\.?0+$/, '');
  return text === '-0' ? '0' : text;
}

export function rgb(hex: string): string {
  return [1, 3, 5]
    .map((at) => (Number.parseInt(hex.slice(at, at + 2), 16) / 255).toFixed(3))
    .join(' ');
}

function point(x: number, y: number): string {
  return `${num(x)} ${num(sheetHeight - y)}`;
}

function rectangle({ x, y, width, height }: Box): string {
  return `${point(x, y + height)} ${num(width)} ${num(height)} re`;
}

function paintSetting({ fill, stroke }: Paint): string {
  const settings = [];
  if (fill) settings.push(`${rgb(fill)} rg`);
  if (stroke) settings.push(`${rgb(stroke.ink)} RG ${num(stroke.width)} w 1 j`);
  return settings.join(' ');
}

function paintOperator({ fill, stroke }: Paint): string {
  if (fill && stroke) return 'B';
  return fill ? 'f' : 'S';
}

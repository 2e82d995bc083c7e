import { inks, type Pen, sheetHeight, sheetWidth, type TypeStyle } from './pen.ts';

const border = 16;
const margin = 38;

/** Inside the frame's line. */
export const frame = {
  left: margin,
  right: sheetWidth - margin,
  top: margin,
  bottom: sheetHeight - margin,
  middle: sheetWidth / 2,
};

/** Ground, border with zones (ISO 5457) and frame: what every sheet has. */
export function drawSheet(pen: Pen): void {
  pen.artifact(() => {
    pen.fillRectangles([{ x: 0, y: 0, width: sheetWidth, height: sheetHeight }], inks.sheet);
    pen.rectangle(
      { x: border, y: border, width: sheetWidth - 2 * border, height: sheetHeight - 2 * border },
      { width: 1, ink: inks.zone },
    );
    pen.rectangle(
      {
        x: frame.left + 1,
        y: frame.top + 1,
        width: frame.right - frame.left - 2,
        height: frame.bottom - frame.top - 2,
      },
      { width: 2, ink: inks.line },
    );
    drawZones(pen);
  });
}

function drawZones(pen: Pen): void {
  const style: TypeStyle = { face: 'data', size: 11, ink: inks.label };
  const tick = { width: 1, ink: inks.zone };
  const band = (border + margin) / 2;
  const columns = [...'123456'];
  const rows = [...'ABCDEFGH'];
  const columnWidth = (frame.right - frame.left) / columns.length;
  const rowHeight = (frame.bottom - frame.top) / rows.length;
  for (const [index, label] of columns.entries()) {
    const x = frame.left + index * columnWidth;
    for (const y of [band, sheetHeight - band]) {
      pen.text(label, style, { x: x + columnWidth / 2, y: y + 4, align: 'middle' });
      if (index > 0) pen.line([x, y - 7], [x, y + 7], tick);
    }
  }
  for (const [index, label] of rows.entries()) {
    const y = frame.top + index * rowHeight;
    for (const x of [band, sheetWidth - band]) {
      pen.text(label, style, { x, y: y + rowHeight / 2 + 4, align: 'middle' });
      if (index > 0) pen.line([x - 7, y], [x + 7, y], tick);
    }
  }
}

// Collar and crimped tube, in a box of 44 by 20.
const collar: [number, number][] = [
  [0.6, 0.6],
  [5.5, 0.6],
  [14.4, 4.2],
  [14.4, 15.8],
  [5.5, 19.4],
  [0.6, 19.4],
];
const tubeTop: [number, number][] = [
  [14, 5],
  [22, 5],
  [22, 7],
  [25.6, 7],
  [25.6, 5],
  [29.6, 5],
  [29.6, 7],
  [33.2, 7],
  [33.2, 5],
  [43.4, 5],
];

/** The Ferrule mark with its top left corner at (x, y), 20 units high. */
export function drawMark(pen: Pen, x: number, y: number): void {
  const moved = ([dx, dy]: [number, number]): [number, number] => [x + dx, y + dy];
  const tubeBottom = tubeTop.map(([dx, dy]): [number, number] => [dx, 20 - dy]).reverse();
  pen.artifact(() => {
    pen.polygon([...tubeTop, ...tubeBottom].map(moved), { fill: inks.copper });
    pen.polygon(collar.map(moved), { fill: inks.main });
  });
}

import { strandCentres, strandKinds } from '../strand-mark.ts';
import { inks, num, type Pen, rgb } from './pen.ts';

/** A lay of the ring: one wavy strand, drawn once and turned into all its places. */
interface Lay {
  name: string;
  radius: number;
  amplitude: number;
  waves: number;
  strands: number;
}

/** Radii as the ring is designed, 211 to its outer edge. */
const outerRadius = 211;
const innerRadius = 142;
const lays: Lay[] = [
  { name: 'Lay1', radius: 176, amplitude: 22, waves: 18, strands: 18 },
  { name: 'Lay2', radius: 202, amplitude: 7, waves: 36, strands: 8 },
  { name: 'Lay3', radius: 149, amplitude: 5, waves: 48, strands: 6 },
];
const curvesPerWave = 6;

/** The drawings the ring repeats, as form contents in the ring's own units. */
export function ringForms(): { name: string; contents: string; bound: number }[] {
  return lays.map((lay) => ({
    name: lay.name,
    bound: outerRadius + 2,
    contents: `${rgb(inks.copper)} RG 0.5 w\n${wavyStrand(lay)}\n`,
  }));
}

// Hermite to Bézier: exact position and direction at every joint.
function wavyStrand({ radius, amplitude, waves }: Lay): string {
  const curves = waves * curvesPerWave;
  const step = (2 * Math.PI) / curves;
  const at = (angle: number): { x: number; y: number; dx: number; dy: number } => {
    const r = radius + amplitude * Math.sin(waves * angle);
    const dr = amplitude * waves * Math.cos(waves * angle);
    const [cos, sin] = [Math.cos(angle), Math.sin(angle)];
    return { x: r * cos, y: r * sin, dx: dr * cos - r * sin, dy: dr * sin + r * cos };
  };
  const parts: string[] = [];
  for (let curve = 0; curve < curves; curve += 1) {
    const from = at(curve * step);
    const to = at((curve + 1) * step);
    if (curve === 0) parts.push(`${num(from.x)} ${num(from.y)} m`);
    const controls = [
      from.x + (from.dx * step) / 3,
      from.y + (from.dy * step) / 3,
      to.x - (to.dx * step) / 3,
      to.y - (to.dy * step) / 3,
      to.x,
      to.y,
    ];
    parts.push(`${controls.map(num).join(' ')} c`);
  }
  return `${parts.join('\n')}\nh S`;
}

/** The rope-lay ring, `radius` to its outer edge. */
export function drawRing(pen: Pen, centre: [number, number], radius: number): void {
  const scale = radius / outerRadius;
  pen.artifact(() => {
    for (const lay of lays) {
      for (let strand = 0; strand < lay.strands; strand += 1) {
        const turn = (2 * Math.PI * strand) / (lay.strands * lay.waves);
        pen.form(lay.name, { centre, scale, turn });
      }
    }
    pen.circle(centre, radius, { stroke: { width: 1.4 * scale, ink: inks.copper } });
    pen.circle(centre, innerRadius * scale, { stroke: { width: 1.2 * scale, ink: inks.copper } });
  });
}

/** The strand mark in its hexagonal crimp, sized to stand in a ring of that radius. */
export function drawStrandMark(
  pen: Pen,
  pattern: number[],
  at: { centre: [number, number]; ringRadius: number },
): void {
  const [x, y] = at.centre;
  const crimp = (at.ringRadius / outerRadius) * 112;
  const hexagon = (radius: number): [number, number][] =>
    [0, 1, 2, 3, 4, 5].map((corner) => [
      x + radius * Math.cos((corner * Math.PI) / 3),
      y + radius * Math.sin((corner * Math.PI) / 3),
    ]);
  const ink = inks.copper;
  pen.polygon(hexagon(crimp * 1.03), { stroke: { width: crimp * 0.03, ink } });
  pen.polygon(hexagon(crimp * 0.965), { stroke: { width: crimp * 0.01, ink } });

  const spacing = (crimp * 0.86) / 3.42;
  const radius = spacing * 0.44;
  for (const [strand, centre] of strandCentres().entries()) {
    const middle: [number, number] = [x + centre.x * spacing, y + centre.y * spacing];
    const kind = pattern[strand];
    if (kind === strandKinds.solid) {
      pen.circle(middle, radius * 1.06, { fill: ink });
    } else {
      pen.circle(middle, radius, { stroke: { width: crimp * 0.014, ink } });
      if (kind === strandKinds.ringWithDot) pen.circle(middle, radius * 0.42, { fill: ink });
    }
  }
}

import { useId } from 'react';

/** Measures of the drawing, in its own units; the narrow one is drawn shorter with larger numbers. */
interface Measures {
  insulationEnd: number;
  strandEnd: number;
  collarAt: number;
  notches: number;
  tubeLength: number;
  gap: number;
  blockWidth: number;
  balloonRadius: number;
  width: number;
}

const axisY = 150;
const wide: Measures = {
  insulationEnd: 250,
  strandEnd: 452,
  collarAt: 520,
  notches: 5,
  tubeLength: 200,
  gap: 70,
  blockWidth: 130,
  balloonRadius: 15,
  width: 1052,
};
const narrow: Measures = {
  insulationEnd: 96,
  strandEnd: 205,
  collarAt: 236,
  notches: 3,
  tubeLength: 132,
  gap: 34,
  blockWidth: 116,
  balloonRadius: 25,
  width: 624,
};

const description =
  'Exploded section of a crimped ferrule: cable insulation, strands, collar, crimped tube, tube wall and terminal, with item numbers one to six';

export function ExplodedFerrule() {
  return (
    <figure className="exploded">
      <Drawing measures={wide} className="only-wide" />
      <Drawing measures={narrow} className="only-narrow" />
    </figure>
  );
}

function Drawing({ measures, className }: { measures: Measures; className: string }) {
  const id = useId();
  return (
    <svg
      className={`drawing ${className}`}
      viewBox={`0 0 ${measures.width} 292`}
      role="img"
      aria-label={description}
    >
      <defs>
        <Hatch id={`${id}-ink`} pitch={7} angle={45} className="hatch-ink" />
        <Hatch id={`${id}-copper`} pitch={5} angle={-45} className="hatch-copper" />
      </defs>
      <Cable measures={measures} hatch={`url(#${id}-ink)`} />
      <Collar at={measures.collarAt} />
      <Tube measures={measures} hatch={`url(#${id}-copper)`} />
      <Block measures={measures} hatch={`url(#${id}-ink)`} />
      <path className="axis" d={`M2 ${axisY}H${measures.width - 12}`} />
      <Balloons measures={measures} />
    </svg>
  );
}

interface HatchProps {
  id: string;
  pitch: number;
  angle: number;
  className: string;
}

function Hatch({ id, pitch, angle, className }: HatchProps) {
  return (
    <pattern
      id={id}
      width={pitch}
      height={pitch}
      patternUnits="userSpaceOnUse"
      patternTransform={`rotate(${angle})`}
    >
      <path className={className} d={`M0 0V${pitch}`} />
    </pattern>
  );
}

interface PartProps {
  measures: Measures;
  hatch: string;
}

function Cable({ measures, hatch }: PartProps) {
  const end = measures.insulationEnd;
  const strands = [0, 1, 2, 3, 4, 5, 6].map((index) => ({
    y: axisY - 22.5 + index * 7.5,
    end: measures.strandEnd - (index % 2) * 7 - Math.abs(3 - index) * 3,
  }));
  return (
    <>
      <path fill={hatch} d={`M20 106H${end}V124H18ZM24 176H${end}V194H20Z`} />
      {strands.map((strand) => (
        <g key={strand.y}>
          <path className="strand-body" d={`M26 ${strand.y}H${strand.end}`} />
          <path className="strand-light" d={`M28 ${strand.y - 1.4}H${strand.end - 3}`} />
        </g>
      ))}
      <path className="conductor" d={`M20 106H${end}V124H15M24 176H${end}V194H20`} />
      <path className="conductor" d="M20 106C10 120 12 136 20 150S30 180 20 194" />
    </>
  );
}

function Collar({ at }: { at: number }) {
  return (
    <g transform={`translate(${at} ${axisY})`}>
      <path className="part" d="M0 -62H26L92 -34V34L26 62H0Z" />
      <path className="solid" d="M0 -62H26L92 -34V-25L26 -49H0ZM0 62H26L92 34V25L26 49H0Z" />
      <path className="conductor" d="M0 -62V62" />
    </g>
  );
}

function Tube({ measures, hatch }: PartProps) {
  const length = measures.tubeLength;
  const edge = (depth: number) =>
    Array.from(
      { length: measures.notches },
      (_, index) => `H${30 + index * 28}v${depth}h12v${-depth}`,
    ).join('');
  const top = `M0 -34${edge(9)}H${length}`;
  const bottom = `M0 34${edge(-9)}H${length}`;
  return (
    <g transform={`translate(${measures.collarAt + 92} ${axisY})`}>
      <path fill={hatch} d={`${top}v13H0Z`} />
      <path fill={hatch} d={`${bottom}v-13H0Z`} />
      <path className="tube" d={`${top}V34${bottom}M0 -21H${length}M0 21H${length}`} />
    </g>
  );
}

function Block({ measures, hatch }: PartProps) {
  const width = measures.blockWidth;
  const body = `M0 -86H${width}V86H0V40H${width - 34}V-40H0Z`;
  return (
    <g transform={`translate(${blockAt(measures)} ${axisY})`}>
      <path className="part" d={body} />
      <path fill={hatch} opacity=".8" d={body} />
      <path className="conductor" d={body} />
      <path className="part" d="M32 -112h32v72l-6 9h-20l-6 -9z" />
      <path
        className="conductor"
        d="M32 -102h32M32 -76l32 -7M32 -63l32 -7M32 -50l32 -7M48 -112v10"
      />
    </g>
  );
}

function blockAt({ collarAt, tubeLength, gap }: Measures): number {
  return collarAt + 92 + tubeLength + gap;
}

function Balloons({ measures }: { measures: Measures }) {
  const isNarrow = measures === narrow;
  const tubeAt = measures.collarAt + 92;
  const above = isNarrow ? 32 : 34;
  const below = isNarrow ? 262 : 252;
  const balloons = [
    { x: isNarrow ? 58 : 140, y: below, tipY: 185 },
    { x: isNarrow ? 164 : 372, y: below, tipY: 160 },
    { x: measures.collarAt + (isNarrow ? 50 : 40), y: above, tipY: 103 },
    { x: tubeAt + 36 + 28 * (isNarrow ? 1 : 2), y: above, tipY: 130 },
    { x: tubeAt + measures.tubeLength - 22, y: below, tipY: 178 },
    {
      x: blockAt(measures) + measures.blockWidth - (isNarrow ? 46 : 26),
      y: isNarrow ? 262 : 268,
      tipY: 212,
    },
  ];
  return balloons.map(({ x, y, tipY }, index) => (
    <g key={x} className={isNarrow ? 'balloon large' : 'balloon'}>
      <path className="dimension" d={`M${x} ${y}V${tipY}`} />
      <circle className="arrowhead" cx={x} cy={tipY} r={isNarrow ? 4 : 2.6} />
      <circle className="part" cx={x} cy={y} r={measures.balloonRadius} />
      <text className="bold" x={x} y={y + (isNarrow ? 8.4 : 4.9)} textAnchor="middle">
        {index + 1}
      </text>
    </g>
  ));
}

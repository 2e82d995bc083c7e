/** Circuit symbols of IEC 60617 as parts of a larger drawing (`<svg className="drawing">`). */
interface At {
  x: number;
  y: number;
}

interface Upright {
  /** Drawn in a vertical conductor. */
  upright?: boolean;
}

export function Conductor({ d, live = false }: { d: string; live?: boolean }) {
  return <path className={live ? 'live' : 'conductor'} d={d} />;
}

export function TerminalPoint({ x, y }: At) {
  return <circle className="part" cx={x} cy={y} r="4" />;
}

export function Fuse({ x, y, upright = false }: At & Upright) {
  return (
    <g transform={`translate(${x} ${y})${upright ? ' rotate(90)' : ''}`}>
      <rect className="part" x="-22" y="-8" width="44" height="16" />
      <path className="conductor" d="M-22 0H22" />
    </g>
  );
}

export function Resistor({ x, y, upright = false }: At & Upright) {
  return (
    <g transform={`translate(${x} ${y})${upright ? ' rotate(90)' : ''}`}>
      <rect className="part" x="-24" y="-9" width="48" height="18" />
    </g>
  );
}

export function LampSymbol({ x, y }: At) {
  return (
    <g transform={`translate(${x} ${y})`}>
      <circle className="part" r="14" />
      <path className="conductor" d="M-9.9 -9.9 9.9 9.9M-9.9 9.9 9.9 -9.9" />
    </g>
  );
}

export function Motor({ x, y }: At) {
  return (
    <g transform={`translate(${x} ${y})`}>
      <circle className="part" r="15" />
      <text className="bold" y="5" textAnchor="middle">
        M
      </text>
    </g>
  );
}

/** Two cells, plus at the top (upright) or at the left. */
export function Battery({ x, y, upright = false }: At & Upright) {
  return (
    <g transform={`translate(${x} ${y})${upright ? '' : ' rotate(-90)'}`}>
      <path className="conductor" d="M-16 -9H16M-16 5H16" />
      <path className="heavy" d="M-8 -2H8M-8 12H8" />
    </g>
  );
}

/** A length from x to toX, with its arrowheads; write the figure beside it. */
export function DimensionLine({ x, y, toX }: At & { toX: number }) {
  return (
    <>
      <path className="dimension" d={`M${x} ${y}H${toX}M${x} ${y - 6}v12M${toX} ${y - 6}v12`} />
      <path className="arrowhead" d={`M${x} ${y}l9 -3v6zM${toX} ${y}l-9 -3v6z`} />
    </>
  );
}

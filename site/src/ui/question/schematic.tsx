import {
  Battery,
  Conductor,
  DimensionLine,
  Fuse,
  LampSymbol,
  Motor,
  Resistor,
} from '../symbols/circuit.tsx';
import { type DiagramView } from './views.ts';

interface Layout {
  className: string;
  width: number;
  left: number;
  right: number;
  fuseX: number;
}

// One circuit, two widths: the wide one beside the given table, the narrow one on a phone.
const wide: Layout = { className: 'only-wide', width: 430, left: 54, right: 352, fuseX: 112 };
const narrow: Layout = { className: 'only-narrow', width: 330, left: 48, right: 262, fuseX: 98 };

const top = 48;
const bottom = 140;
const middle = (top + bottom) / 2;

/** A battery feeding one load over a pair: the drawing of most questions about a run. */
export function Schematic({ diagram }: { diagram: DiagramView }) {
  const { labels } = diagram;
  const said = `Two-wire run: battery ${labels.source}, fuse ${labels.fuse}, ${labels.cable} out and back, ${diagram.load} ${labels.load}, ${labels.loadNote}, ${labels.length}`;
  return (
    <figure className="schematic" aria-label={said}>
      <Drawing diagram={diagram} layout={wide} />
      <Drawing diagram={diagram} layout={narrow} />
    </figure>
  );
}

function Drawing({ diagram, layout }: { diagram: DiagramView; layout: Layout }) {
  const { labels } = diagram;
  const { left, right, fuseX } = layout;
  const afterFuse = fuseX + 22;
  const middleOfRun = (afterFuse + right) / 2;
  return (
    <svg
      className={`drawing ${layout.className}`}
      viewBox={`0 0 ${layout.width} 190`}
      aria-hidden="true"
    >
      <Conductor d={`M${left} ${middle - 9}V${top}H${fuseX - 22}`} />
      <Conductor live d={`M${afterFuse} ${top}H${right}`} />
      <Conductor live d={`M${right} ${bottom}H${left}`} />
      <Conductor d={`M${left} ${bottom}V${middle + 12}`} />
      <Conductor d={`M${right} ${top}V${bottom}`} />
      <Battery x={left} y={middle} upright />
      <Fuse x={fuseX} y={top} />
      <LoadSymbol load={diagram.load} x={right} y={middle} />
      <DimensionLine x={afterFuse} y={168} toX={right} />
      <text className="second" x={left - 32} y={middle - 18}>
        +
      </text>
      <text className="second" x={left - 32} y={middle + 28}>
        −
      </text>
      <text x={left + 22} y={middle + 6}>
        {labels.source}
      </text>
      <text x={fuseX} y={top - 18} textAnchor="middle">
        {labels.fuse}
      </text>
      <text className="second" x={middleOfRun} y={top - 12} textAnchor="middle">
        {labels.cable}
      </text>
      <text className="second" x={middleOfRun} y={160} textAnchor="middle">
        {labels.length}
      </text>
      <text x={right + 24} y={middle - 2}>
        {labels.load}
      </text>
      <text className="second" x={right + 24} y={middle + 16}>
        {labels.loadNote}
      </text>
    </svg>
  );
}

function LoadSymbol({ load, x, y }: { load: DiagramView['load']; x: number; y: number }) {
  if (load === 'lamp') return <LampSymbol x={x} y={y} />;
  if (load === 'motor') return <Motor x={x} y={y} />;
  return <Resistor x={x} y={y} upright />;
}

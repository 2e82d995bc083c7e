import { type PointerEvent } from 'react';
import { headOf } from './curve-lines.ts';
import { type CurveLayout, placeCurve, type PlacedCurve, type Reading } from './curve-scales.ts';
import { type CurveView } from './views.ts';

type Interval = CurveView['intervals'][number];

interface CurveDrawingProps {
  curve: CurveView;
  cursor: Reading;
  /** The interval the cursor stands in. */
  within: Interval | undefined;
  layout: CurveLayout;
  className: string;
  /** A finger or the mouse moves the cursor; the slider below does it for the keyboard. */
  onMove: (hours: number) => void;
}

/** Voltage over current on one time axis, with the marked intervals and the cursor. */
export function CurveDrawing({ curve, layout, className, ...props }: CurveDrawingProps) {
  const placed = placeCurve(curve, layout);
  const move = (event: PointerEvent<SVGSVGElement>) => {
    if (event.type === 'pointerdown') event.currentTarget.setPointerCapture(event.pointerId);
    else if (event.buttons === 0) return;
    const box = event.currentTarget.getBoundingClientRect();
    props.onMove(placed.x.invert(((event.clientX - box.left) / box.width) * layout.width));
  };
  return (
    <svg
      className={`drawing ${className}`}
      viewBox={`0 0 ${layout.width} ${layout.height}`}
      aria-hidden="true"
      onPointerDown={move}
      onPointerMove={move}
    >
      {curve.intervals.map((interval) => (
        <Bracket
          key={interval.label}
          interval={interval}
          placed={placed}
          isCurrent={interval === props.within}
        />
      ))}
      <Axes placed={placed} layout={layout} />
      {placed.lines.map(({ key, pane, path, dashes }) => (
        <path key={key} className={`curve-${pane}`} d={path} strokeDasharray={dashes} />
      ))}
      {placed.lines.map((line) => (
        <text
          key={line.key}
          className={line.pane === 'volts' ? 'bold pen direct' : 'bold direct'}
          {...line.label}
        >
          {headOf(line)}
        </text>
      ))}
      <Cursor cursor={props.cursor} placed={placed} />
    </svg>
  );
}

function Axes({ placed, layout }: { placed: PlacedCurve; layout: CurveLayout }) {
  const edge = layout.width - layout.right;
  const figure = (tick: number, y: number) => (
    <g key={tick}>
      <path className="rule" d={`M${layout.left} ${y}H${edge}`} />
      <text className="second" x={layout.left - 8} y={y + 5} textAnchor="end">
        {tick}
      </text>
    </g>
  );
  return (
    <>
      <g>{placed.voltTicks.map((tick) => figure(tick, placed.volts(tick)))}</g>
      <g>{placed.ampTicks.map((tick) => figure(tick, placed.amps(tick)))}</g>
      {placed.timeTicks.map((tick) => {
        const x = placed.x(tick / placed.time.perHour);
        return (
          <g key={tick}>
            <path className="conductor" d={`M${x} ${placed.ampsFoot}v5`} />
            <text className="second" x={x} y={placed.ampsFoot + 20} textAnchor="middle">
              {tick}
            </text>
          </g>
        );
      })}
      <path
        className="conductor"
        d={`M${layout.left} ${placed.ampsTop}V${placed.ampsFoot}H${edge}`}
      />
      <path
        className="conductor"
        d={`M${layout.left} ${placed.voltsTop}V${placed.voltsFoot}H${edge}`}
      />
      <text className="second" x={edge} y={layout.height - 2} textAnchor="end">
        Time, {placed.time.unit}
      </text>
    </>
  );
}

function Cursor({ cursor, placed }: { cursor: Reading; placed: PlacedCurve }) {
  const x = placed.x(cursor.hours);
  const grip = (placed.voltsFoot + placed.ampsTop) / 2;
  return (
    <>
      <path className="cursor" d={`M${x} ${placed.voltsTop - 8}V${placed.ampsFoot}`} />
      {placed.lines.map(({ key, pane, y }, index) => (
        <circle
          key={key}
          className={`part at-${pane}`}
          cx={x}
          cy={y(cursor.values[index] ?? 0)}
          r="5"
        />
      ))}
      <rect className="grip" x={x - 10} y={grip - 13} width="20" height="26" />
      <path className="grip-bars" d={`M${x - 3} ${grip - 6}v12M${x + 3} ${grip - 6}v12`} />
    </>
  );
}

interface BracketProps {
  interval: Interval;
  placed: PlacedCurve;
  isCurrent: boolean;
}

function Bracket({ interval, placed, isCurrent }: BracketProps) {
  const from = placed.x(interval.fromH);
  const to = placed.x(interval.toH);
  const { bracketTop: top, ampsFoot: foot } = placed;
  return (
    <g className={isCurrent ? 'interval current' : 'interval'}>
      <rect className="span" x={from} y={top} width={to - from} height={foot - top} />
      <path className="bracket" d={`M${from} ${top + 8}V${top}H${to}V${top + 8}`} />
      <path className="edge" d={`M${from} ${top + 12}V${foot}M${to} ${top + 12}V${foot}`} />
      <text className="interval-letter" x={(from + to) / 2} y={top - 8} textAnchor="middle">
        {interval.label}
      </text>
    </g>
  );
}

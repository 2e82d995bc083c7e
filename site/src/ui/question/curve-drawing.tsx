import { type CurveLayout, placeCurve, type PlacedCurve, type Reading } from './curve-scales.ts';
import { type CurveView } from './views.ts';

interface CurveDrawingProps {
  curve: CurveView;
  cursor: Reading;
  layout: CurveLayout;
  className: string;
}

/** Voltage over current on one time axis, with the marked intervals and the cursor. */
export function CurveDrawing({ curve, cursor, layout, className }: CurveDrawingProps) {
  const placed = placeCurve(curve, layout);
  const cursorX = placed.x(cursor.hours);
  return (
    <svg
      className={`drawing ${className}`}
      viewBox={`0 0 ${layout.width} ${layout.height}`}
      aria-hidden="true"
    >
      <Axes placed={placed} layout={layout} />
      <path className="curve-volts" d={placed.voltsPath} />
      <path className="curve-amps" d={placed.ampsPath} />
      {curve.intervals.map((interval) => (
        <Bracket key={interval.label} interval={interval} placed={placed} />
      ))}
      <path className="cursor" d={`M${cursorX} ${placed.bracketTop + 10}V${placed.ampsFoot}`} />
      <circle className="part" cx={cursorX} cy={placed.volts(cursor.volts)} r="4.5" />
      <circle className="part" cx={cursorX} cy={placed.amps(cursor.amps)} r="4.5" />
    </svg>
  );
}

function Axes({ placed, layout }: { placed: PlacedCurve; layout: CurveLayout }) {
  const edge = layout.width - layout.right;
  return (
    <>
      {placed.voltTicks.map((tick) => (
        <g key={`volts ${tick}`}>
          <path className="rule" d={`M${layout.left} ${placed.volts(tick)}H${edge}`} />
          <text className="second" x={layout.left - 8} y={placed.volts(tick) + 5} textAnchor="end">
            {tick}
          </text>
        </g>
      ))}
      {placed.ampTicks.map((tick) => (
        <g key={`amps ${tick}`}>
          <path className="rule" d={`M${layout.left} ${placed.amps(tick)}H${edge}`} />
          <text className="second" x={layout.left - 8} y={placed.amps(tick) + 5} textAnchor="end">
            {tick}
          </text>
        </g>
      ))}
      {placed.hourTicks.map((tick) => (
        <g key={`hours ${tick}`}>
          <path className="conductor" d={`M${placed.x(tick)} ${placed.ampsFoot}v5`} />
          <text className="second" x={placed.x(tick)} y={placed.ampsFoot + 20} textAnchor="middle">
            {tick}
          </text>
        </g>
      ))}
      <path
        className="conductor"
        d={`M${layout.left} ${placed.ampsTop}V${placed.ampsFoot}H${edge}`}
      />
      <path
        className="conductor"
        d={`M${layout.left} ${placed.bracketTop + 16}V${placed.voltsFoot}H${edge}`}
      />
      <text className="second" x={edge} y={layout.height - 4} textAnchor="end">
        Time, h
      </text>
      <text className="bold pen" x={layout.left + 8} y={placed.bracketTop + 12}>
        Voltage, V
      </text>
      <text className="bold" x={edge} y={placed.ampsTop - 6} textAnchor="end">
        Current, A
      </text>
    </>
  );
}

interface BracketProps {
  interval: CurveView['intervals'][number];
  placed: PlacedCurve;
}

function Bracket({ interval, placed }: BracketProps) {
  const from = placed.x(interval.fromH);
  const to = placed.x(interval.toH);
  return (
    <g>
      <path className="dash" d={`M${from} 24V${placed.ampsFoot}M${to} 24V${placed.ampsFoot}`} />
      <path className="dimension" d={`M${from} 30V22H${to}V30`} />
      <text className="bold" x={(from + to) / 2} y="16" textAnchor="middle">
        {interval.label}
      </text>
    </g>
  );
}

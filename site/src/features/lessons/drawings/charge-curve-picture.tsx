import { type Drawn, pathThrough, scaleBetween, ticksBetween } from './drawing-data.ts';

type Stage = Drawn<'charge-curve'>['stages'][number];

interface CurvePictureProps {
  data: Drawn<'charge-curve'>;
  /** The stage at hand. */
  at: Stage;
  width: number;
}

const left = 40;
const right = 10;
const volts = { top: 52, foot: 190 };
const amps = { top: 226, foot: 330 };
const height = 372;

const startWithCapital = (word: string) => word.charAt(0).toUpperCase() + word.slice(1);

function placeOn(data: Drawn<'charge-curve'>, width: number) {
  const most = data.points.map((point) => point.volts);
  const voltsFrom = Math.floor(Math.min(...most));
  const voltsTo = Math.ceil(Math.max(...most));
  const ampsTo = Math.ceil(data.settings.chargerA / 10) * 10;
  return {
    ...{ voltsFrom, voltsTo, ampsTo, edge: width - right },
    x: scaleBetween([0, data.hours], [left, width - right]),
    voltsY: scaleBetween([voltsFrom, voltsTo], [volts.foot, volts.top]),
    ampsY: scaleBetween([0, ampsTo], [amps.foot, amps.top]),
  };
}

type Placed = ReturnType<typeof placeOn>;

/** Volts over amperes on one time axis; the stage at hand is shaded and bracketed. */
export function ChargeCurvePicture({ data, at, width }: CurvePictureProps) {
  const placed = placeOn(data, width);
  const { x, voltsY, ampsY } = placed;
  return (
    <svg viewBox={`0 0 ${width} ${height}`}>
      {data.stages.map((stage) => (
        <StageSpan key={stage.name} stage={stage} placed={placed} isAt={stage === at} />
      ))}
      <Axes placed={placed} hours={data.hours} />
      <path
        className="curve-v"
        d={pathThrough(data.points.map((one) => [x(one.hour), voltsY(one.volts)]))}
      />
      <path
        className="curve-i"
        d={pathThrough(data.points.map((one) => [x(one.hour), ampsY(one.amps)]))}
      />
      {[
        { hour: at.fromH, ...at.from },
        { hour: at.toH, ...at.to },
      ].map((end) => (
        <g key={end.hour}>
          <circle className="fillink" cx={x(end.hour)} cy={voltsY(end.volts)} r="4" />
          <circle className="fillcopper" cx={x(end.hour)} cy={ampsY(end.amps)} r="4" />
        </g>
      ))}
    </svg>
  );
}

function StageSpan({
  stage,
  placed: { x },
  isAt,
}: {
  stage: Stage;
  placed: Placed;
  isAt: boolean;
}) {
  const from = x(stage.fromH);
  const to = x(stage.toH);
  return (
    <>
      {isAt && (
        <rect className="stage-at" x={from} y="34" width={to - from} height={amps.foot - 34} />
      )}
      <path className={isAt ? 'curve-i' : 'dim'} d={`M${from + 1} 42V34H${to - 1}V42`} />
      <path className="dim dash" d={`M${to} 44V${amps.foot}`} />
      <text className={isAt ? 'tx-b' : undefined} x={(from + to) / 2} y="24" textAnchor="middle">
        {startWithCapital(stage.name)}
      </text>
    </>
  );
}

function Axes({ placed, hours }: { placed: Placed; hours: number }) {
  const { x, edge, voltsFrom, voltsTo, ampsTo } = placed;
  const figure = (tick: number, y: number) => (
    <g key={y}>
      <path className="rule" d={`M${left} ${y}H${edge}`} />
      <text className="tx-s" x={left - 7} y={y + 4} textAnchor="end">
        {tick}
      </text>
    </g>
  );
  return (
    <>
      {ticksBetween(voltsFrom, voltsTo, 1).map((tick) => figure(tick, placed.voltsY(tick)))}
      {ticksBetween(0, ampsTo, 10).map((tick) => figure(tick, placed.ampsY(tick)))}
      <path className="ln" d={`M${left} ${volts.top}V${volts.foot}H${edge}`} />
      <path className="ln" d={`M${left} ${amps.top}V${amps.foot}H${edge}`} />
      {ticksBetween(0, hours, 1).map((tick) => (
        <g key={tick}>
          <path className="ln" d={`M${x(tick)} ${amps.foot}v5`} />
          <text className="tx-s" x={x(tick)} y={amps.foot + 19} textAnchor="middle">
            {tick}
          </text>
        </g>
      ))}
      <text className="tx-b halo" x={edge - 4} y={volts.top + 14} textAnchor="end">
        Volts
      </text>
      <text className="tx-b halo" x={edge - 4} y={amps.top + 14} textAnchor="end">
        Amperes
      </text>
      <text className="tx-s" x={edge} y={height - 4} textAnchor="end">
        Time, h
      </text>
    </>
  );
}

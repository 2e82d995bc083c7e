import { type Drawn, pathThrough, sayFigure, ticksBetween } from './drawing-data.ts';
import { type RunSet, type RunVolts } from './run-sums.ts';

/** Where the parts stand along the circuit, drawn out straight. */
interface RunLayout {
  width: number;
  plus: number;
  fuse: number;
  fuseEnd: number;
  load: number;
  loadEnd: number;
  minus: number;
}

export const wideRun: RunLayout = {
  ...{ width: 720, plus: 58, fuse: 102, fuseEnd: 146 },
  ...{ load: 322, loadEnd: 398, minus: 662 },
};
export const narrowRun: RunLayout = {
  ...{ width: 350, plus: 48, fuse: 62, fuseEnd: 90 },
  ...{ load: 172, loadEnd: 214, minus: 332 },
};

const top = 162;
const foot = 346;
const labelRoom = 15;

interface RunPictureProps {
  data: Drawn<'voltage-run'>;
  set: RunSet;
  volts: RunVolts;
  layout: RunLayout;
}

/** Both ends of the scale are drawn large, with a break between them, until the drop is large too. */
function placeVolts(supplyV: number, eachV: number) {
  const spans = [0.75, 1.5, 3];
  const span = spans.find((one) => eachV <= one) ?? supplyV / 2;
  const isBroken = span < supplyV / 2;
  const perVolt = ((foot - top) * (isBroken ? 0.4 : 0.5)) / span;
  return {
    ...{ span, isBroken, perVolt },
    fromTop: (volts: number) => top + (supplyV - volts) * perVolt,
    fromFoot: (volts: number) => foot - volts * perVolt,
  };
}

export function VoltageRunPicture({ data, set, volts, layout }: RunPictureProps) {
  const scale = placeVolts(data.supplyV, volts.eachV);
  return (
    <svg viewBox={`0 28 ${layout.width} 330`}>
      <Circuit set={set} layout={layout} />
      <Axis data={data} volts={volts} layout={layout} scale={scale} />
      {data.limits.map((limit) => (
        <LimitMark key={limit.percent} limit={limit} layout={layout} perVolt={scale.perVolt} />
      ))}
      <VoltsLine volts={volts} layout={layout} scale={scale} />
    </svg>
  );
}

function Circuit({ set, layout }: { set: RunSet; layout: RunLayout }) {
  const { plus, fuse, fuseEnd, load, loadEnd, minus } = layout;
  const middle = (load + loadEnd) / 2;
  return (
    <>
      <path className="ln" d={`M${plus} 70H${fuse}`} />
      <path className="live" d={`M${fuseEnd} 70H${load}M${loadEnd} 70H${minus}`} />
      <rect className="fillsheet" x={fuse} y="62" width={fuseEnd - fuse} height="16" />
      <rect className="lnb" x={fuse} y="62" width={fuseEnd - fuse} height="16" />
      <path className="ln" d={`M${fuse} 70H${fuseEnd}`} />
      <rect className="lnb" x={load} y="57" width={loadEnd - load} height="26" />
      {[plus, minus].map((x) => (
        <g key={x}>
          <circle className="fillsheet" cx={x} cy="70" r="4" />
          <circle className="lnb" cx={x} cy="70" r="4" />
        </g>
      ))}
      <text className="tx-b" x={middle} y="75" textAnchor="middle">
        E1
      </text>
      <text className="tx-b" x={plus - 14} y="44">
        B1 +
      </text>
      <text x={(fuse + fuseEnd) / 2 + 6} y="44" textAnchor="middle">
        F1
      </text>
      <text x={middle} y="44" textAnchor="middle">
        {sayFigure(set.amps, 0)}&thinsp;A
      </text>
      <text className="tx-b" x={minus + 14} y="44" textAnchor="end">
        B1 −
      </text>
      <Length from={fuseEnd} to={load} label={`${sayFigure(set.lengthM, 1)}\u2009m out`} />
      <Length from={loadEnd} to={minus} label={`${sayFigure(set.lengthM, 1)}\u2009m back`} />
    </>
  );
}

function Length({ from, to, label }: { from: number; to: number; label: string }) {
  return (
    <>
      <path className="dim" d={`M${from} 102H${to}M${from} 96v12M${to} 96v12`} />
      <path className="fillink" d={`M${from} 102l9 -3.2v6.4zM${to} 102l-9 -3.2v6.4z`} />
      <text className="tx-s" x={(from + to) / 2} y="122" textAnchor="middle">
        {label}
      </text>
    </>
  );
}

interface ScaledProps {
  volts: RunVolts;
  layout: RunLayout;
  scale: ReturnType<typeof placeVolts>;
}

function Axis({ data, volts, layout, scale }: ScaledProps & Pick<RunPictureProps, 'data'>) {
  const { plus, minus } = layout;
  const middle = (top + foot) / 2;
  const marks = [
    { at: data.supplyV, y: top },
    { at: volts.plusV, y: scale.fromTop(volts.plusV) },
    { at: volts.minusV, y: scale.fromFoot(volts.minusV) },
    { at: 0, y: foot },
  ].filter(({ y }, index) => index % 3 === 0 || (y - top >= labelRoom && foot - y >= labelRoom));
  return (
    <>
      {scale.isBroken ? (
        <path
          className="ln"
          d={`M${plus} ${top - 8}V${middle - 6}M${plus} ${middle + 6}V${foot + 8}m0 0M${plus - 6} ${middle - 3}l12 -5M${plus - 6} ${middle + 8}l12 -5`}
        />
      ) : (
        <path className="ln" d={`M${plus} ${top - 8}V${foot + 8}`} />
      )}
      <text className="tx-s" x={plus + 8} y={top - 8}>
        Volts to B1 −
      </text>
      {marks.map(({ at, y }) => (
        <g key={y}>
          <path className="dim dash" d={`M${plus} ${y}H${minus}`} />
          <text className="tx-s" x={plus - 6} y={y + 4} textAnchor="end">
            {sayFigure(at, 2)}
          </text>
        </g>
      ))}
      <ScaleTicks scale={scale} at={plus} supplyV={data.supplyV} />
    </>
  );
}

/** A short stroke each half volt, or each volt once the whole is drawn. */
function ScaleTicks({
  scale,
  at,
  supplyV,
}: Pick<ScaledProps, 'scale'> & { at: number; supplyV: number }) {
  const step = scale.span > 1.5 ? 1 : 0.25;
  const strokes = ticksBetween(0, scale.span, step).flatMap((volts) => [
    scale.fromTop(supplyV - volts),
    scale.fromFoot(volts),
  ]);
  return <path className="ln" d={strokes.map((y) => `M${at} ${y}h4`).join('')} />;
}

interface LimitMarkProps {
  limit: Drawn<'voltage-run'>['limits'][number];
  layout: RunLayout;
  perVolt: number;
}

/** Half of what is allowed stands on each conductor. */
function LimitMark({ limit, layout, perVolt }: LimitMarkProps) {
  const room = (limit.volts / 2) * perVolt;
  if (room < labelRoom || room > (foot - top) / 2 - labelRoom) return null;
  const { fuse, load, loadEnd, minus } = layout;
  const label = `${limit.percent}\u2009%`;
  return (
    <>
      <path
        className="limit"
        d={`M${fuse} ${top + room}H${load}M${loadEnd} ${foot - room}H${minus}`}
      />
      <text className="tx-s" x={fuse} y={top + room + 14}>
        {label}
      </text>
      <text className="tx-s" x={minus} y={foot - room - 4} textAnchor="end">
        {label}
      </text>
    </>
  );
}

function VoltsLine({ volts, layout, scale }: ScaledProps) {
  const { plus, fuseEnd, load, loadEnd, minus, width } = layout;
  const plusY = scale.fromTop(volts.plusV);
  const minusY = scale.fromFoot(volts.minusV);
  const each = `${sayFigure(volts.eachV, 3)}\u2009V`;
  const isWide = width > 400;
  return (
    <>
      <path
        className="live"
        d={pathThrough([
          [plus, top],
          [fuseEnd, top],
          [load, plusY],
        ])}
      />
      <path className="lnb dash" d={`M${load} ${plusY}L${loadEnd} ${minusY}`} />
      <path className="live" d={`M${loadEnd} ${minusY}L${minus} ${foot}`} />
      <circle className="fillcopper" cx={load} cy={plusY} r="4" />
      <circle className="fillcopper" cx={loadEnd} cy={minusY} r="4" />
      <text className="tx-b halo" x={load + 10} y={top + 20}>
        {each} {isWide && 'lost going '}out
      </text>
      <text className="tx-b halo" x={loadEnd - 10} y={foot - 8} textAnchor="end">
        {each} {isWide && 'lost coming '}back
      </text>
      <text className="tx-b halo" x={(load + loadEnd) / 2 + 18} y={(top + foot) / 2 + 5}>
        {sayFigure(volts.leftV, 3)}&thinsp;V left{isWide && ' for E1'}
      </text>
    </>
  );
}

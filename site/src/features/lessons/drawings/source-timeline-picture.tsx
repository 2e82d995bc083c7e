import { type Drawn, pathThrough, scaleBetween, ticksBetween } from './drawing-data.ts';
import { type Instant } from './timeline-sums.ts';

interface TimelinePictureProps {
  data: Drawn<'source-timeline'>;
  instant: Instant;
  width: number;
}

const left = 40;
const right = 12;
const lanes = { engine: 44, volts: 88, voltsFoot: 196, input: 216, amps: 272, ampsFoot: 330 };
const height = 372;

type Place = ReturnType<typeof scaleBetween>;

/** Engine, vehicle input, chosen input and charger current over the same minutes. */
export function SourceTimelinePicture({ data, instant, width }: TimelinePictureProps) {
  const x = scaleBetween([0, data.minutes], [left, width - right]);
  return (
    <svg viewBox={`0 0 ${width} ${height}`}>
      {data.events.map(({ minute }, index) => (
        <EventMark
          key={minute}
          x={x(minute)}
          number={index + 1}
          before={x(data.events[index - 1]?.minute ?? -9)}
        />
      ))}
      <EngineLane data={data} x={x} />
      <VoltsLane data={data} x={x} edge={width - right} isWide={width > 400} />
      <InputLane data={data} x={x} />
      <AmpsLane data={data} x={x} edge={width - right} />
      <path className="cursor" d={`M${x(instant.minute)} 26V${lanes.ampsFoot + 4}`} />
    </svg>
  );
}

/** Numbers that stand too close step aside. */
function EventMark({ x, number, before }: { x: number; number: number; before: number }) {
  const aside = x - before < 16 ? 8 : number % 2 ? -4 : 4;
  return (
    <>
      <path className="dim dash" d={`M${x} 26V${lanes.ampsFoot}`} />
      <text className="tx-s tx-b" x={x + aside} y="18" textAnchor="middle">
        {number}
      </text>
    </>
  );
}

function EngineLane({ data, x }: { data: Drawn<'source-timeline'>; x: Place }) {
  const running = data.spells.filter(({ engine }) => engine);
  const from = x(running[0]?.fromMinute ?? 0);
  const to = x(running.at(-1)?.toMinute ?? 0);
  return (
    <>
      <path className="ln" d={`M${x(0)} ${lanes.engine}H${x(data.minutes)}`} />
      <rect className="fillinset" x={from} y={lanes.engine - 14} width={to - from} height="28" />
      <rect className="lnb" x={from} y={lanes.engine - 14} width={to - from} height="28" />
      <text className="tx-b" x={(from + to) / 2} y={lanes.engine + 5} textAnchor="middle">
        Engine on
      </text>
    </>
  );
}

interface LaneProps {
  data: Drawn<'source-timeline'>;
  x: Place;
  edge: number;
}

function VoltsLane({ data, x, edge, isWide }: LaneProps & { isWide: boolean }) {
  const volts = data.points.map(({ inputV }) => inputV);
  const from = Math.floor(Math.min(...volts, data.settings.releaseV));
  const to = Math.ceil(Math.max(...volts, data.settings.engageV));
  const y = scaleBetween([from, to], [lanes.voltsFoot, lanes.volts]);
  const { engageV, releaseV } = data.settings;
  const level = (at: number, word: string, below: number) => (
    <>
      <path className="limit" d={`M${left} ${y(at)}H${edge}`} />
      <text className="tx-s halo" x={edge} y={y(at) + below} textAnchor="end">
        {isWide && word} {at.toFixed(1)}&thinsp;V
      </text>
    </>
  );
  return (
    <>
      {ticksBetween(from, to, 1).map((tick) => (
        <text key={tick} className="tx-s" x={left - 7} y={y(tick) + 4} textAnchor="end">
          {tick}
        </text>
      ))}
      <path className="ln" d={`M${left} ${lanes.volts}V${lanes.voltsFoot}H${edge}`} />
      <path
        className="curve-v"
        d={pathThrough(data.points.map((one) => [x(one.minute), y(one.inputV)]))}
      />
      {level(engageV, 'engage', -5)}
      {level(releaseV, 'release', 14)}
      <text className="tx-s tx-b halo" x={left + 6} y={lanes.volts - 6}>
        Vehicle input, V
      </text>
    </>
  );
}

const inputNames = { solar: 'Panel', vehicle: 'Vehicle', none: 'None' };

function InputLane({ data, x }: Omit<LaneProps, 'edge'>) {
  const merged = mergeInputs(data.spells);
  return merged.map(({ source, fromMinute, toMinute }) => {
    const from = x(fromMinute);
    const width = x(toMinute) - from;
    return (
      <g key={fromMinute}>
        <rect
          className={source === 'vehicle' ? 'input-taken' : 'fillsheet'}
          x={from}
          y={lanes.input}
          width={width}
          height="28"
        />
        <rect className="lnb" x={from} y={lanes.input} width={width} height="28" />
        <text
          className={source === 'vehicle' ? 'tx-b on-copper' : 'tx-b'}
          x={from + width / 2}
          y={lanes.input + 19}
          textAnchor="middle"
        >
          {inputNames[source]}
        </text>
      </g>
    );
  });
}

type Spell = Drawn<'source-timeline'>['spells'][number];

/** One box for as long as the same input feeds. */
function mergeInputs(spells: readonly Spell[]): Spell[] {
  const merged: Spell[] = [];
  for (const spell of spells) {
    const last = merged.at(-1);
    if (last?.source === spell.source) merged.splice(-1, 1, { ...last, toMinute: spell.toMinute });
    else merged.push(spell);
  }
  return merged;
}

function AmpsLane({ data, x, edge }: LaneProps) {
  const most = Math.max(data.settings.chargerA, data.settings.solarA);
  const y = scaleBetween([0, most], [lanes.ampsFoot, lanes.amps]);
  const steps = data.spells.flatMap(({ fromMinute, toMinute, chargerA }) => [
    [x(fromMinute), y(chargerA)] as const,
    [x(toMinute), y(chargerA)] as const,
  ]);
  return (
    <>
      {[0, most].map((tick) => (
        <text key={tick} className="tx-s" x={left - 7} y={y(tick) + 4} textAnchor="end">
          {tick}
        </text>
      ))}
      <path className="ln" d={`M${left} ${lanes.amps}V${lanes.ampsFoot}H${edge}`} />
      <path className="curve-i" d={pathThrough(steps)} />
      <text className="tx-s tx-b halo" x={left + 6} y={lanes.amps + 4}>
        Charger, A
      </text>
      {ticksBetween(0, data.minutes, 10).map((tick) => (
        <g key={tick}>
          <path className="ln" d={`M${x(tick)} ${lanes.ampsFoot}v5`} />
          <text className="tx-s" x={x(tick)} y={lanes.ampsFoot + 19} textAnchor="middle">
            {tick}
          </text>
        </g>
      ))}
      <text className="tx-s" x={edge} y={height - 4} textAnchor="end">
        Time, min
      </text>
    </>
  );
}

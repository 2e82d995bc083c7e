import { type Balance, type BalanceSet } from './balance-sums.ts';
import { type Drawn, sayFigure } from './drawing-data.ts';

/** Where the branches stand between the two bars. */
interface BalanceLayout {
  width: number;
  charger: number;
  firstLoad: number;
  between: number;
  barEnd: number;
  battery: number;
  bypass: number;
}

export const wideBalance: BalanceLayout = {
  ...{
    width: 720,
    charger: 80,
    firstLoad: 220,
    between: 90,
    barEnd: 440,
    battery: 560,
    bypass: 660,
  },
};
export const narrowBalance: BalanceLayout = {
  ...{
    width: 350,
    charger: 32,
    firstLoad: 104,
    between: 46,
    barEnd: 216,
    battery: 270,
    bypass: 322,
  },
};

const plus = 44;
const minus = 214;
const post = 186;

interface BalancePictureProps {
  data: Drawn<'current-balance'>;
  set: BalanceSet;
  balance: Balance;
  layout: BalanceLayout;
}

/** Charger and loads between the bars; the battery behind its shunt; one load on the post. */
export function CurrentBalancePicture({ data, set, balance, layout }: BalancePictureProps) {
  const { barEnd, battery, charger, firstLoad, between } = layout;
  const lastLoad = firstLoad + between * (data.loads.length - 1);
  return (
    <svg viewBox={`0 30 ${layout.width} 304`}>
      <path className="lnb" d={`M${charger} ${plus}H${battery}`} />
      <path className="busbar" d={`M${charger - 16} ${minus}H${barEnd}`} />
      <Branch x={charger} letter="U1" amps={balance.chargerA} way={-1} />
      {data.loads.map(({ name, amps }, index) => (
        <Branch
          key={name}
          x={firstLoad + index * between}
          letter={letterIn(name, index)}
          amps={set.on.has(name) ? amps : 0}
          way={1}
          isSwitched
        />
      ))}
      <path className="dim" d={`M${firstLoad - 20} 234v6H${lastLoad + 20}v-6`} />
      <text className="tx-b" x={(firstLoad + lastLoad) / 2} y="258" textAnchor="middle">
        {sayFigure(balance.loadsA, 2)}&thinsp;A
      </text>
      <BatteryBranch
        balance={balance}
        layout={layout}
        letter={letterIn(data.bypass.name, data.loads.length)}
      />
      <Strip balance={balance} layout={layout} />
    </svg>
  );
}

/** "M1" of "Motor M1"; what has no reference letter is counted. */
const letterIn = (name: string, index: number) => /\b[A-Z]\d+\b/.exec(name)?.[0] ?? `E${index + 1}`;

interface BranchProps {
  x: number;
  letter: string;
  amps: number;
  /** 1: current goes down, -1: up. */
  way: 1 | -1;
  isSwitched?: boolean;
}

function Branch({ x, letter, amps, way, isSwitched = false }: BranchProps) {
  const isLive = amps > 0;
  return (
    <>
      <path
        className={isLive ? 'live' : 'dead'}
        d={`M${x} ${plus}V${isSwitched ? 66 : 112}M${x} 142V${minus - 5}`}
      />
      {isSwitched && (
        <path
          className={isLive ? 'live' : 'dead'}
          d={isLive ? `M${x} 66V112` : `M${x} 112V94l-14 -24`}
        />
      )}
      <rect className="fillsheet" x={x - 17} y="112" width="34" height="30" />
      <rect className="lnb" x={x - 17} y="112" width="34" height="30" />
      <text className="tx-b" x={x} y="132" textAnchor="middle">
        {letter}
      </text>
      {isLive && <Arrow x={x} y={172} way={way} />}
      <text className="tx-s" x={x + 8} y="160">
        {sayFigure(amps, 2)}
      </text>
    </>
  );
}

function Arrow({ x, y, way }: { x: number; y: number; way: number }) {
  return <path className="fillcopper" d={`M${x} ${y + 8 * way}l-6 ${-13 * way}h12z`} />;
}

interface BatteryBranchProps {
  balance: Balance;
  layout: BalanceLayout;
  /** Of the load on the post. */
  letter: string;
}

/** Battery B1, shunt R1 from its post to the bar, and what hangs on the post itself. */
function BatteryBranch({ balance, layout, letter }: BatteryBranchProps) {
  const { battery, bypass, barEnd } = layout;
  const { batteryA, bypassA, monitorA } = balance;
  const middle = (barEnd + battery) / 2;
  const line = (amps: number) => (Math.abs(amps) > 0.004 ? 'live' : 'dead');
  return (
    <>
      <path className={line(batteryA)} d={`M${battery} ${plus}V112M${battery} 134V${post}`} />
      <path className="lnb" d={`M${battery - 18} 112h36M${battery - 18} 127h36`} />
      <path className="fillink" d={`M${battery - 9} 118h18v3h-18zM${battery - 9} 133h18v3h-18z`} />
      <text className="tx-b halo" x={battery - 24} y="128" textAnchor="end">
        B1
      </text>
      {line(batteryA) === 'live' && <Arrow x={battery} y={160} way={Math.sign(batteryA)} />}
      <path className={line(monitorA)} d={`M${battery} ${post}V${minus}H${barEnd}`} />
      <rect className="fillsheet" x={middle - 20} y={minus - 8} width="40" height="16" />
      <rect className="lnb" x={middle - 20} y={minus - 8} width="40" height="16" />
      <text className="tx-s" x={middle} y={minus - 14} textAnchor="middle">
        R1
      </text>
      <text className="tx-b" x={middle} y="258" textAnchor="middle">
        {sayFigure(monitorA, 2)}&thinsp;A
      </text>
      <path
        className={line(bypassA)}
        d={`M${battery} 78H${bypass}V${bypassA > 0 ? 118 : 92}M${bypass} 148V${post}H${battery}`}
      />
      {bypassA === 0 && <path className="dead" d={`M${bypass} 118V112l-13 -18`} />}
      <rect className="fillsheet" x={bypass - 17} y="118" width="34" height="30" />
      <rect className="lnb" x={bypass - 17} y="118" width="34" height="30" />
      <text className="tx-b" x={bypass} y="138" textAnchor="middle">
        {letter}
      </text>
      {bypassA > 0 && <Arrow x={bypass} y={168} way={1} />}
      <text className="tx-s" x={bypass - 8} y="172" textAnchor="end">
        {sayFigure(bypassA, 2)}
      </text>
      <circle className="fillink" cx={battery} cy={post} r="4" />
    </>
  );
}

/** To scale: what comes to the bars above, what goes from them below. Both are as long. */
function Strip({ balance, layout }: { balance: Balance; layout: BalanceLayout }) {
  const { chargerA, loadsA, monitorA } = balance;
  const left = layout.charger - 16;
  const perAmp = (layout.width - 16 - left) / Math.max(chargerA, loadsA, 1);
  const into = monitorA > 0 ? [loadsA, monitorA] : [loadsA];
  const from = monitorA < 0 ? [chargerA, -monitorA] : [chargerA];
  return (
    <>
      <StripRow y={278} parts={from} left={left} perAmp={perAmp} />
      <StripRow y={306} parts={into} left={left} perAmp={perAmp} />
    </>
  );
}

interface StripRowProps {
  y: number;
  parts: number[];
  left: number;
  perAmp: number;
}

function StripRow({ y, parts, left, perAmp }: StripRowProps) {
  return parts.map((amps, index) => {
    const before = parts.slice(0, index).reduce((sum, one) => sum + one, 0);
    const x = left + before * perAmp;
    const width = amps * perAmp;
    return (
      <g key={index}>
        <rect
          className={index ? 'fillinset' : 'strip-first'}
          x={x}
          y={y}
          width={width}
          height="22"
        />
        <rect className="lnb" x={x} y={y} width={width} height="22" />
        {width > 52 && (
          <text className="tx-s" x={x + width / 2} y={y + 15} textAnchor="middle">
            {sayFigure(amps, 2)}
          </text>
        )}
      </g>
    );
  });
}

import { useState } from 'react';
import { TickBox } from '../../../ui/choice-row.tsx';
import { Quantity } from '../../../ui/quantity.tsx';
import { type Balance, balanceOf, type BalanceSet } from './balance-sums.ts';
import { CurrentBalancePicture, narrowBalance, wideBalance } from './current-balance-picture.tsx';
import { type Drawn, sayFigure } from './drawing-data.ts';
import { HandledFigure, MoveRange } from './handled-figure.tsx';

interface CurrentBalanceProps {
  title: string;
  data: Drawn<'current-balance'>;
}

const startOf = ({ chargerA, loads, bypass }: Drawn<'current-balance'>): BalanceSet => ({
  chargerA: chargerA.start,
  on: new Set([...loads, bypass].filter(({ isOn }) => isOn).map(({ name }) => name)),
});

/** Charger, monitor and loads: three meters, one current. */
export function CurrentBalance({ title, data }: CurrentBalanceProps) {
  const [set, setSet] = useState(() => startOf(data));
  const balance = balanceOf(data, set);
  const drawn = { data, set, balance };
  return (
    <HandledFigure
      title={title}
      wide={<CurrentBalancePicture {...drawn} layout={wideBalance} />}
      narrow={<CurrentBalancePicture {...drawn} layout={narrowBalance} />}
      controls={<BalanceControls data={data} set={set} onSet={setSet} />}
      said={<BalanceSaid balance={balance} bypass={data.bypass.name} />}
      table={tableOf(data, set, balance)}
      source={data.source}
    />
  );
}

interface BalanceControlsProps {
  data: Drawn<'current-balance'>;
  set: BalanceSet;
  onSet: (set: BalanceSet) => void;
}

function BalanceControls({ data, set, onSet }: BalanceControlsProps) {
  const turn = (name: string, isOn: boolean) => {
    const on = new Set(set.on);
    if (isOn) on.add(name);
    else on.delete(name);
    onSet({ ...set, on });
  };
  return (
    <>
      <MoveRange
        label="Charger U1"
        range={data.chargerA}
        value={set.chargerA}
        shown={<Quantity value={sayFigure(set.chargerA, 1)} unit="A" />}
        spoken={`${set.chargerA} amperes`}
        onMove={(chargerA) => onSet({ ...set, chargerA })}
      />
      <fieldset className="loads-on">
        <legend>Switched on</legend>
        {[...data.loads, data.bypass].map(({ name, amps }) => (
          <TickBox
            key={name}
            checked={set.on.has(name)}
            onChange={(isOn) => turn(name, isOn)}
            label={
              <>
                {name}, <Quantity value={amps} unit="A" />
              </>
            }
          />
        ))}
      </fieldset>
    </>
  );
}

function BalanceSaid({ balance, bypass }: { balance: Balance; bypass: string }) {
  const { chargerA, loadsA, monitorA, bypassA, batteryA } = balance;
  return (
    <>
      <span className="meters">
        <Meter name="Charger" amps={chargerA} note="gives" />
        <Meter name="Loads on the bar" amps={loadsA} note="take" />
        <Meter
          name="Monitor"
          amps={monitorA}
          note={monitorA < 0 ? 'out of the battery' : 'plus into the battery'}
        />
      </span>
      <span>
        Charger less loads less monitor: {sayFigure(chargerA, 2)} − {sayFigure(loadsA, 2)}{' '}
        {monitorA < 0 ? '+' : '−'} {sayFigure(Math.abs(monitorA), 2)} = <b>0</b>.{' '}
        {sayBattery(batteryA)}{' '}
        {bypassA > 0
          ? `The monitor counts the ${sayFigure(bypassA, 2)}\u2009A of ${bypass} as the battery’s.`
          : 'The monitor says the same.'}
      </span>
    </>
  );
}

function sayBattery(batteryA: number): string {
  const amps = `${sayFigure(Math.abs(batteryA), 2)}\u2009A`;
  if (Math.abs(batteryA) < 0.005) return 'The battery itself gives and takes nothing.';
  return batteryA > 0 ? `The battery itself gets ${amps}.` : `The battery itself gives ${amps}.`;
}

function Meter({ name, amps, note }: { name: string; amps: number; note: string }) {
  return (
    <span className="meter">
      <small>{name}</small>{' '}
      <b>
        <Quantity value={sayFigure(amps, 2)} unit="A" />
      </b>{' '}
      <small>{note}</small>
    </span>
  );
}

function tableOf(data: Drawn<'current-balance'>, { on }: BalanceSet, balance: Balance) {
  const row = (head: string, amps: number) => ({ head, cells: [sayFigure(amps, 2)] });
  return {
    label: 'The currents as a table',
    head: ['Branch', 'Amperes'],
    rows: [
      row('Charger U1', balance.chargerA),
      ...data.loads.map(({ name, amps }) => row(name, on.has(name) ? amps : 0)),
      row('Loads on the bar', balance.loadsA),
      row('Monitor, through shunt R1', balance.monitorA),
      row(data.bypass.name, balance.bypassA),
      row('Battery B1 itself', balance.batteryA),
    ],
  };
}

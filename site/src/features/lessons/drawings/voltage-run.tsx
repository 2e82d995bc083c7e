import { useState } from 'react';
import { Quantity } from '../../../ui/quantity.tsx';
import { type Drawn, sayFigure } from './drawing-data.ts';
import { HandledFigure, MoveRange } from './handled-figure.tsx';
import { runVolts, type RunSet, type RunVolts, sayLimits } from './run-sums.ts';
import { narrowRun, VoltageRunPicture, wideRun } from './voltage-run-picture.tsx';

interface VoltageRunProps {
  title: string;
  data: Drawn<'voltage-run'>;
}

/** Volts along a two-wire run, with its length, conductor and current to move. */
export function VoltageRun({ title, data }: VoltageRunProps) {
  const [set, setSet] = useState<RunSet>(data.start);
  const volts = runVolts(data, set);
  const drawn = { data, set, volts };
  return (
    <HandledFigure
      title={title}
      wide={<VoltageRunPicture {...drawn} layout={wideRun} />}
      narrow={<VoltageRunPicture {...drawn} layout={narrowRun} />}
      controls={<RunControls data={data} set={set} onSet={setSet} />}
      said={<RunSaid data={data} set={set} volts={volts} />}
      table={tableOf(data, volts)}
      source={data.source}
    />
  );
}

interface RunControlsProps {
  data: Drawn<'voltage-run'>;
  set: RunSet;
  onSet: (set: RunSet) => void;
}

function RunControls({ data, set, onSet }: RunControlsProps) {
  return (
    <>
      <MoveRange
        label="Length one way"
        range={data.lengthM}
        value={set.lengthM}
        shown={<Quantity value={sayFigure(set.lengthM, 1)} unit="m" />}
        spoken={`${set.lengthM} metres`}
        onMove={(lengthM) => onSet({ ...set, lengthM })}
      />
      <MoveRange
        label="Current"
        range={data.amps}
        value={set.amps}
        shown={<Quantity value={set.amps} unit="A" />}
        spoken={`${set.amps} amperes`}
        onMove={(amps) => onSet({ ...set, amps })}
      />
      <label className="move-range">
        <span>Conductor</span>
        <select
          className="entry"
          value={set.areaMm2}
          onChange={(event) => onSet({ ...set, areaMm2: Number(event.target.value) })}
        >
          {data.areas.map(({ areaMm2 }) => (
            <option key={areaMm2} value={areaMm2}>
              {areaMm2}&thinsp;mm²
            </option>
          ))}
        </select>
      </label>
    </>
  );
}

function RunSaid({
  data,
  set,
  volts,
}: Pick<RunControlsProps, 'data' | 'set'> & { volts: RunVolts }) {
  const each = <Quantity value={sayFigure(volts.eachV, 3)} unit="V" />;
  return (
    <>
      <Quantity value={sayFigure(set.lengthM, 1)} unit="m" /> each way of{' '}
      <Quantity value={set.areaMm2} unit="mm²" /> at <Quantity value={set.amps} unit="A" />: {each}{' '}
      lost going out, {each} coming back.{' '}
      <b>
        <Quantity value={sayFigure(volts.lostV, 3)} unit="V" /> in all
      </b>
      , <Quantity value={sayFigure(volts.percent, 1)} unit="%" /> of{' '}
      <Quantity value={data.supplyV} unit="V" />.{' '}
      <b>
        <Quantity value={sayFigure(volts.leftV, 3)} unit="V" /> left for E1.
      </b>{' '}
      {sayLimits(data, volts)}
    </>
  );
}

function tableOf({ supplyV }: Drawn<'voltage-run'>, { plusV, minusV, leftV, lostV }: RunVolts) {
  const row = (head: string, volts: number) => ({ head, cells: [sayFigure(volts, 3)] });
  return {
    label: 'The volts as a table',
    head: ['Point', 'Volts to B1 −'],
    rows: [
      row('B1 +, and after F1', supplyV),
      row('E1, plus side', plusV),
      row('E1, minus side', minusV),
      row('B1 −', 0),
      row('Left across E1', leftV),
      row('Lost in both conductors', lostV),
    ],
  };
}

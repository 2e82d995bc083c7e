import { Button } from '@radix-ui/themes';
import { useState } from 'react';
import { Quantity } from '../../../ui/quantity.tsx';
import { ChargeCurvePicture } from './charge-curve-picture.tsx';
import { type Drawn, sayFigure } from './drawing-data.ts';
import { HandledFigure } from './handled-figure.tsx';

interface ChargeCurveProps {
  title: string;
  data: Drawn<'charge-curve'>;
}

type Stage = Drawn<'charge-curve'>['stages'][number];

/** One charge, gone through stage by stage. */
export function ChargeCurve({ title, data }: ChargeCurveProps) {
  const [index, setIndex] = useState(0);
  const count = data.stages.length;
  const stage = data.stages[index];
  if (!stage) return null;
  const go = (by: number) => setIndex((index + by + count) % count);
  return (
    <HandledFigure
      title={title}
      wide={<ChargeCurvePicture data={data} at={stage} width={720} />}
      narrow={<ChargeCurvePicture data={data} at={stage} width={350} />}
      controls={
        <span className="buttons">
          <Button size="3" variant="outline" onClick={() => go(-1)}>
            Stage before
          </Button>
          <Button size="3" variant="outline" onClick={() => go(1)}>
            Next stage
          </Button>
        </span>
      }
      said={<StageSaid stage={stage} place={`Stage ${index + 1} of ${count}`} />}
      table={tableOf(data, stage)}
      source={`${sayCharge(data)} ${data.source}`}
    />
  );
}

function StageSaid({ stage, place }: { stage: Stage; place: string }) {
  const { from, to } = stage;
  return (
    <>
      <b>
        {place}: {stage.name}
      </b>
      , from <Quantity value={sayFigure(stage.fromH, 2)} unit="h" /> to{' '}
      <Quantity value={sayFigure(stage.toH, 2)} unit="h" />. Voltage{' '}
      <Moved from={from.volts} to={to.volts} places={2} unit="V" />, current{' '}
      <Moved from={from.amps} to={to.amps} places={1} unit="A" />, charge{' '}
      <Moved from={from.chargePercent} to={to.chargePercent} places={0} unit="%" />.{' '}
      <Quantity value={sayFigure(stage.ah, 1)} unit="Ah" /> put in. {stage.says}
    </>
  );
}

interface MovedProps {
  from: number;
  to: number;
  places: number;
  unit: string;
}

function Moved({ from, to, places, unit }: MovedProps) {
  const [first, last] = [sayFigure(from, places), sayFigure(to, places)];
  return first === last ? (
    <>
      held at <Quantity value={last} unit={unit} />
    </>
  ) : (
    <>
      <Quantity value={first} unit={unit} /> to <Quantity value={last} unit={unit} />
    </>
  );
}

function sayCharge({ battery, settings }: Drawn<'charge-curve'>): string {
  const { chargerA, absorptionV, floatV, tailA } = settings;
  return (
    `${battery.name}, ${battery.capacityAh}\u2009Ah, from ${battery.startPercent}\u2009% charged. ` +
    `Charger ${chargerA}\u2009A, absorption ${absorptionV}\u2009V, float ${floatV}\u2009V, tail ${tailA}\u2009A.`
  );
}

function tableOf({ stages }: Drawn<'charge-curve'>, at: Stage) {
  const pair = (from: number, to: number, places: number) =>
    `${sayFigure(from, places)} to ${sayFigure(to, places)}`;
  return {
    label: 'The stages as a table',
    head: ['Stage', 'Time, h', 'Volts', 'Amperes', 'Charge, %', 'Put in, Ah'],
    rows: stages.map((stage) => ({
      head: stage.name,
      isAt: stage === at,
      cells: [
        pair(stage.fromH, stage.toH, 2),
        pair(stage.from.volts, stage.to.volts, 2),
        pair(stage.from.amps, stage.to.amps, 1),
        pair(stage.from.chargePercent, stage.to.chargePercent, 0),
        sayFigure(stage.ah, 1),
      ],
    })),
  };
}

import { Button } from '@radix-ui/themes';
import { useState } from 'react';
import { Quantity } from '../../../ui/quantity.tsx';
import { type Drawn, sayFigure } from './drawing-data.ts';
import { HandledFigure, MoveRange } from './handled-figure.tsx';
import { SourceTimelinePicture } from './source-timeline-picture.tsx';
import { type Instant, instantAt, stepEvent } from './timeline-sums.ts';

interface SourceTimelineProps {
  title: string;
  data: Drawn<'source-timeline'>;
}

const inputWords = { solar: 'the panel', vehicle: 'the vehicle', none: 'no input' };

/** Which input feeds the charger, minute by minute. */
export function SourceTimeline({ title, data }: SourceTimelineProps) {
  const [minute, setMinute] = useState(0);
  const instant = instantAt(data, minute);
  if (!instant) return null;
  return (
    <HandledFigure
      title={title}
      wide={<SourceTimelinePicture data={data} instant={instant} width={720} />}
      narrow={<SourceTimelinePicture data={data} instant={instant} width={350} />}
      controls={<TimeControls data={data} instant={instant} onMove={setMinute} />}
      said={
        <InstantSaid
          instant={instant}
          number={data.events.findIndex((one) => one === instant.event) + 1}
        />
      }
      table={tableOf(data, instant)}
      source={`${sayEvents(data)} ${data.source}`}
    />
  );
}

interface TimeControlsProps {
  data: Drawn<'source-timeline'>;
  instant: Instant;
  onMove: (minute: number) => void;
}

function TimeControls({ data, instant, onMove }: TimeControlsProps) {
  const { minute } = instant;
  return (
    <>
      <MoveRange
        label="Time"
        range={{ from: 0, to: data.minutes, step: 1 }}
        value={minute}
        shown={<Quantity value={minute} unit="min" />}
        spoken={`minute ${minute}, ${sayFigure(instant.inputV, 1)} volts, fed by ${inputWords[instant.spell.source]}`}
        onMove={onMove}
      />
      <span className="buttons">
        <Button size="3" variant="outline" onClick={() => onMove(stepEvent(data, minute, -1))}>
          Event before
        </Button>
        <Button size="3" variant="outline" onClick={() => onMove(stepEvent(data, minute, 1))}>
          Next event
        </Button>
      </span>
    </>
  );
}

/** The numbers over the drawing. */
function sayEvents({ events }: Drawn<'source-timeline'>): string {
  const said = events.map(
    ({ minute, title }, index) => `${index + 1} ${title}, ${minute}\u2009min`,
  );
  return `${said.join('; ')}.`;
}

interface InstantSaidProps {
  instant: Instant;
  /** Of the event, over the drawing. */
  number: number;
}

function InstantSaid({ instant, number }: InstantSaidProps) {
  const { minute, inputV, spell, event } = instant;
  return (
    <>
      <b>
        Minute {minute}
        {event && `, event ${number}: ${event.title}`}.
      </b>{' '}
      Engine {spell.engine ? 'on' : 'off'}, vehicle input{' '}
      <Quantity value={sayFigure(inputV, 1)} unit="V" />. Fed by {inputWords[spell.source]}, charger{' '}
      <Quantity value={sayFigure(spell.chargerA, 0)} unit="A" />. {event?.says ?? spell.says}
    </>
  );
}

function tableOf({ spells, events }: Drawn<'source-timeline'>, at: Instant) {
  return {
    label: 'The hour as a table',
    head: ['Minutes', 'Begins with', 'Engine', 'Fed by', 'Charger, A', 'What it says'],
    rows: spells.map((spell) => ({
      head: `${spell.fromMinute} to ${spell.toMinute}`,
      isAt: spell === at.spell,
      cells: [
        events.find(({ minute }) => minute === spell.fromMinute)?.title ?? '',
        spell.engine ? 'on' : 'off',
        inputWords[spell.source],
        sayFigure(spell.chargerA, 0),
        spell.says,
      ],
    })),
  };
}

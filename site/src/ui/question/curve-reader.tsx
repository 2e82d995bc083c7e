import { useId, useState } from 'react';
import { Quantity } from '../quantity.tsx';
import { CurveDrawing } from './curve-drawing.tsx';
import './curve.css';
import { type CurveLayout, readAt, type Reading, readingsOf } from './curve-scales.ts';
import { type CurveView } from './views.ts';

const wide: CurveLayout = { width: 840, height: 450, left: 46, right: 14 };
const narrow: CurveLayout = { width: 350, height: 410, left: 34, right: 8 };

const step = 0.1;
const leap = 1;

/** "3.6 hours, 14.40 volts, 14.9 amperes" */
function sayReading({ hours, volts, amps }: Reading): string {
  return `${hours.toFixed(1)} hours, ${volts.toFixed(2)} volts, ${amps.toFixed(1)} amperes`;
}

/** A charge curve to read: a cursor moved by slider, keys or buttons, and the readings as a table. */
export function CurveReader({ curve }: { curve: CurveView }) {
  const end = curve.hours.at(-1) ?? 0;
  const [hours, setHours] = useState(() => Math.round(end * 5) / 10);
  const cursor = readAt(curve, hours);
  const put = (at: number) => setHours(Math.min(end, Math.max(0, Math.round(at * 10) / 10)));
  const within = curve.intervals.find(({ fromH, toH }) => fromH <= hours && hours <= toH);
  const drawn = { curve, cursor, within, onMove: put };
  return (
    <div className="curve" role="group" aria-label="Charge curve">
      <CurveDrawing {...drawn} layout={wide} className="only-wide" />
      <CurveDrawing {...drawn} layout={narrow} className="only-narrow" />
      <p className="visually-hidden">{sayIntervals(curve)}</p>
      <CursorControls cursor={cursor} end={end} onPut={put} />
      <ReadingsTable curve={curve} within={within} />
    </div>
  );
}

function sayIntervals({ intervals }: CurveView): string {
  return intervals
    .map(
      ({ label, fromH, toH }) =>
        `Interval ${label}: ${fromH.toFixed(1)} to ${toH.toFixed(1)} hours.`,
    )
    .join(' ');
}

interface CursorControlsProps {
  cursor: Reading;
  end: number;
  onPut: (hours: number) => void;
}

function CursorControls({ cursor, end, onPut }: CursorControlsProps) {
  const id = useId();
  return (
    <div className="curve-cursor">
      <label className="curve-slider" htmlFor={id}>
        <span className="visually-hidden">Cursor, time in hours</span>
        <input
          id={id}
          type="range"
          min={0}
          max={end}
          step={step}
          value={cursor.hours}
          aria-valuetext={sayReading(cursor)}
          onChange={(event) => onPut(Number(event.target.value))}
          onKeyDown={(event) => {
            const by = { PageUp: leap, PageDown: -leap }[event.key];
            if (by === undefined) return;
            event.preventDefault();
            onPut(cursor.hours + by);
          }}
        />
      </label>
      <dl>
        <div>
          <dt>Time</dt>
          <dd>
            <Quantity value={cursor.hours.toFixed(1)} unit="h" />
          </dd>
        </div>
        <div>
          <dt>Voltage</dt>
          <dd className="pen">
            <Quantity value={cursor.volts.toFixed(2)} unit="V" />
          </dd>
        </div>
        <div>
          <dt>Current</dt>
          <dd>
            <Quantity value={cursor.amps.toFixed(1)} unit="A" />
          </dd>
        </div>
      </dl>
      <p className="curve-steps not-printed">
        <button
          type="button"
          onClick={() => onPut(cursor.hours - step)}
          aria-label="Cursor back 0.1 hours"
        >
          ‹
        </button>
        <button
          type="button"
          onClick={() => onPut(cursor.hours + step)}
          aria-label="Cursor on 0.1 hours"
        >
          ›
        </button>
      </p>
    </div>
  );
}

interface ReadingsTableProps {
  curve: CurveView;
  within: CurveView['intervals'][number] | undefined;
}

function ReadingsTable({ curve, within }: ReadingsTableProps) {
  const readings = readingsOf(curve);
  const isWithin = readings.map(
    ({ hours }) => within !== undefined && within.fromH <= hours && hours <= within.toH,
  );
  const rows = [
    { name: 'Time, h', figures: readings.map(({ hours }) => String(Number(hours.toFixed(2)))) },
    { name: 'Voltage, V', figures: readings.map(({ volts }) => volts.toFixed(2)) },
    { name: 'Current, A', figures: readings.map(({ amps }) => amps.toFixed(1)) },
  ];
  return (
    // The table scrolls sideways on a phone, so the keyboard must reach it.
    // eslint-disable-next-line jsx-a11y/no-noninteractive-tabindex
    <div className="table-scroll" role="group" aria-label="Table of readings" tabIndex={0}>
      <table className="readings">
        <caption>Table of readings</caption>
        <tbody>
          {rows.map(({ name, figures }) => (
            <tr key={name}>
              <th scope="row">{name}</th>
              {figures.map((figure, index) => (
                <td key={index} className={isWithin[index] ? 'number within' : 'number'}>
                  {figure}
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}

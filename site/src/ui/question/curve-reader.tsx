import { useId, useState } from 'react';
import { Quantity } from '../quantity.tsx';
import { CurveDrawing } from './curve-drawing.tsx';
import { type CurveLine, figureOf, headOf, linesOf } from './curve-lines.ts';
import './curve.css';
import { type CurveLayout, readAt, type Reading, readingsOf } from './curve-scales.ts';
import { type CurveView } from './views.ts';

const wide: CurveLayout = { width: 840, height: 450, left: 46, right: 14 };
const narrow: CurveLayout = { width: 350, height: 410, left: 34, right: 8 };

const step = 0.1;
const leap = 1;

/** "3.6 hours, 14.40 volts, 14.9 amperes" */
function sayReading(lines: readonly CurveLine[], { hours, values }: Reading): string {
  const said = lines.map((line, index) => {
    const figure = figureOf(line, values[index] ?? 0).replace('\u2212', 'minus ');
    return `${figure} ${line.said}`;
  });
  return [`${hours.toFixed(1)} hours`, ...said].join(', ');
}

/** A charge curve to read: a cursor moved by slider, keys or buttons, and the readings as a table. */
export function CurveReader({ curve }: { curve: CurveView }) {
  const end = curve.hours.at(-1) ?? 0;
  const [hours, setHours] = useState(() => Math.round(end * 5) / 10);
  const cursor = readAt(curve, hours);
  const lines = linesOf(curve);
  const put = (at: number) => setHours(Math.min(end, Math.max(0, Math.round(at * 10) / 10)));
  const within = curve.intervals.find(({ fromH, toH }) => fromH <= hours && hours <= toH);
  const drawn = { curve, cursor, within, onMove: put };
  return (
    <div className="curve" role="group" aria-label="Charge curve">
      <CurveDrawing {...drawn} layout={wide} className="only-wide" />
      <CurveDrawing {...drawn} layout={narrow} className="only-narrow" />
      <p className="visually-hidden">{sayIntervals(curve)}</p>
      <CursorControls lines={lines} cursor={cursor} end={end} onPut={put} />
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
  lines: readonly CurveLine[];
  cursor: Reading;
  end: number;
  onPut: (hours: number) => void;
}

function CursorControls({ lines, cursor, end, onPut }: CursorControlsProps) {
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
          aria-valuetext={sayReading(lines, cursor)}
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
        {lines.map((line, index) => (
          <div key={line.key}>
            <dt>
              {line.name}
              {lines.length > 2 && <LineSample line={line} />}
            </dt>
            <dd className={line.pane === 'volts' ? 'pen' : undefined}>
              <Quantity value={figureOf(line, cursor.values[index] ?? 0)} unit={line.unit} />
            </dd>
          </div>
        ))}
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

/** How the line is drawn, beside its name. */
function LineSample({ line }: { line: CurveLine }) {
  return (
    <svg className="line-sample" viewBox="0 0 30 6" width="30" height="6" aria-hidden="true">
      <path className={`curve-${line.pane}`} d="M0 3H30" strokeDasharray={line.dashes} />
    </svg>
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
    ...linesOf(curve).map((line, index) => ({
      name: headOf(line),
      figures: readings.map(({ values }) => figureOf(line, values[index] ?? 0)),
    })),
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

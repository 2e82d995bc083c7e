import { useId, useState } from 'react';
import { Quantity } from '../quantity.tsx';
import { CurveDrawing } from './curve-drawing.tsx';
import { type CurveLine, figureOf, headOf, linesOf } from './curve-lines.ts';
import './curve.css';
import { type CurveLayout, readAt, readingsOf } from './curve-scales.ts';
import { type CurveTime, placeCursor, timeOf } from './curve-time.ts';
import { type CurveView } from './views.ts';

const wide: CurveLayout = { width: 840, height: 450, left: 46, right: 14 };
const narrow: CurveLayout = { width: 350, height: 410, left: 34, right: 8 };

interface Read {
  time: CurveTime;
  /** Where the cursor stands, in the unit of the time. */
  at: number;
  lines: readonly CurveLine[];
  values: readonly number[];
}

/** "3.6 hours, 14.40 volts, 14.9 amperes" */
function sayReading({ time, at, lines, values }: Read): string {
  const said = lines.map((line, index) => {
    const figure = figureOf(line, values[index] ?? 0).replace('\u2212', 'minus ');
    return `${figure} ${line.said}`;
  });
  return [`${at.toFixed(time.places)} ${time.said}`, ...said].join(', ');
}

/** A charge curve to read: a cursor moved by slider, keys or buttons, and the readings as a table. */
export function CurveReader({ curve }: { curve: CurveView }) {
  const time = timeOf(curve);
  const [at, setAt] = useState(() => placeCursor(time, time.end / 2));
  const cursor = readAt(curve, at / time.perHour);
  const put = (next: number) => setAt(placeCursor(time, next));
  const within = curve.intervals.find(
    ({ fromH, toH }) => fromH <= cursor.hours && cursor.hours <= toH,
  );
  const onMove = (hours: number) => put(hours * time.perHour);
  const drawn = { curve, cursor, within, onMove };
  return (
    <div className="curve" role="group" aria-label="Charge curve">
      <CurveDrawing {...drawn} layout={wide} className="only-wide" />
      <CurveDrawing {...drawn} layout={narrow} className="only-narrow" />
      <p className="visually-hidden">{sayIntervals(curve, time)}</p>
      <CursorControls {...{ time, at }} lines={linesOf(curve)} values={cursor.values} onPut={put} />
      <ReadingsTable curve={curve} time={time} within={within} />
    </div>
  );
}

function sayIntervals({ intervals }: CurveView, { perHour, places, said }: CurveTime): string {
  const figure = (hours: number) => (hours * perHour).toFixed(places);
  return intervals
    .map(
      ({ label, fromH, toH }) => `Interval ${label}: ${figure(fromH)} to ${figure(toH)} ${said}.`,
    )
    .join(' ');
}

/** "0.1 hours", "1 second" */
const sayStep = ({ step, said }: CurveTime) => (step === 1 ? said.slice(0, -1) : said);

interface CursorControlsProps extends Read {
  onPut: (at: number) => void;
}

function CursorControls({ onPut, ...read }: CursorControlsProps) {
  const id = useId();
  const { time, at, lines, values } = read;
  return (
    <div className="curve-cursor">
      <label className="curve-slider" htmlFor={id}>
        <span className="visually-hidden">Cursor, time in {time.said}</span>
        <input
          id={id}
          type="range"
          min={0}
          max={time.end}
          step={time.step}
          value={at}
          aria-valuetext={sayReading(read)}
          onChange={(event) => onPut(Number(event.target.value))}
          onKeyDown={(event) => {
            const by = { PageUp: time.leap, PageDown: -time.leap }[event.key];
            if (by === undefined) return;
            event.preventDefault();
            onPut(at + by);
          }}
        />
      </label>
      <dl>
        <div>
          <dt>Time</dt>
          <dd>
            <Quantity value={at.toFixed(time.places)} unit={time.unit} />
          </dd>
        </div>
        {lines.map((line, index) => (
          <div key={line.key}>
            <dt>
              {line.name}
              {lines.length > 2 && <LineSample line={line} />}
            </dt>
            <dd className={line.pane === 'volts' ? 'pen' : undefined}>
              <Quantity value={figureOf(line, values[index] ?? 0)} unit={line.unit} />
            </dd>
          </div>
        ))}
      </dl>
      <p className="curve-steps not-printed">
        <button
          type="button"
          onClick={() => onPut(at - time.step)}
          aria-label={`Cursor back ${time.step} ${sayStep(time)}`}
        >
          ‹
        </button>
        <button
          type="button"
          onClick={() => onPut(at + time.step)}
          aria-label={`Cursor on ${time.step} ${sayStep(time)}`}
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
  time: CurveTime;
  within: CurveView['intervals'][number] | undefined;
}

function ReadingsTable({ curve, time, within }: ReadingsTableProps) {
  const readings = readingsOf(curve);
  const isWithin = readings.map(
    ({ hours }) => within !== undefined && within.fromH <= hours && hours <= within.toH,
  );
  const rows = [
    {
      name: `Time, ${time.unit}`,
      figures: readings.map(({ hours }) => String(Number((hours * time.perHour).toFixed(2)))),
    },
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

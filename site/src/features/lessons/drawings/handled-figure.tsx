import { type ReactNode, useId } from 'react';
import './handled.css';
import { ScrollTable } from '../../../ui/scroll-table.tsx';

interface HandledFigureProps {
  title: string;
  /** The drawing for a wide and for a narrow page. */
  wide: ReactNode;
  narrow: ReactNode;
  /** What the reader moves. */
  controls: ReactNode;
  /** The same in words, spoken when it changes. */
  said: ReactNode;
  table: {
    label: string;
    head: string[];
    rows: { head: string; cells: string[]; isAt?: boolean }[];
  };
  source: string;
}

/** A drawing the reader can move: picture, controls, its numbers in words and as a table. */
export function HandledFigure({
  title,
  wide,
  narrow,
  controls,
  said,
  ...rest
}: HandledFigureProps) {
  const titleId = useId();
  return (
    <figure className="lesson-figure handled" aria-labelledby={titleId}>
      <p className="handled-title" id={titleId}>
        {title}
      </p>
      <div className="figure-drawing" aria-hidden="true">
        <div className="only-wide">{wide}</div>
        <div className="only-narrow">{narrow}</div>
      </div>
      <div className="handled-controls not-printed" role="group" aria-label="To move">
        {controls}
      </div>
      <output className="handled-said">{said}</output>
      <figcaption>
        <details>
          <summary>{rest.table.label}</summary>
          <FigureTable {...rest.table} />
        </details>
        <p>{rest.source}</p>
      </figcaption>
    </figure>
  );
}

function FigureTable({ label, head, rows }: HandledFigureProps['table']) {
  return (
    <ScrollTable label={label}>
      <thead>
        <tr>
          {head.map((name) => (
            <th key={name} scope="col">
              {name}
            </th>
          ))}
        </tr>
      </thead>
      <tbody>
        {rows.map((row) => (
          <tr key={row.head} className={row.isAt ? 'within' : undefined}>
            <th scope="row">{row.head}</th>
            {row.cells.map((cell, index) => (
              <td key={index}>{cell}</td>
            ))}
          </tr>
        ))}
      </tbody>
    </ScrollTable>
  );
}

interface MoveRangeProps {
  label: string;
  range: { from: number; to: number; step: number };
  value: number;
  /** As shown: "5.5 m". */
  shown: ReactNode;
  /** As spoken: "5.5 metres". */
  spoken: string;
  onMove: (value: number) => void;
}

/** A labelled slider with its value beside it. */
export function MoveRange({ label, range, value, shown, spoken, onMove }: MoveRangeProps) {
  return (
    <label className="move-range">
      <span>
        {label} <b>{shown}</b>
      </span>
      <input
        type="range"
        aria-label={label}
        aria-valuetext={spoken}
        min={range.from}
        max={range.to}
        step={range.step}
        value={value}
        onChange={(event) => onMove(Number(event.target.value))}
      />
    </label>
  );
}

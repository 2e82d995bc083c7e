import { type ReactNode, useId, useState } from 'react';
import { type Cell, placeCells } from './cell-rows.ts';

interface TitleBlockProps {
  cells: Cell<ReactNode>[];
}

/** The drawing's title block (ISO 7200). On a phone the first row stands and the rest folds. */
export function TitleBlock({ cells }: TitleBlockProps) {
  const [open, setOpen] = useState(false);
  const listId = useId();
  const placed = placeCells(cells);
  const folds = placed.some((cell) => !cell.className.includes('first-row'));
  return (
    <div className={open ? 'title-block-wrap open' : 'title-block-wrap'}>
      <dl className="title-block" id={listId}>
        {placed.map((cell) => (
          <div key={cell.label} className={cell.className}>
            <dt>{cell.label}</dt>
            <dd>{cell.value}</dd>
          </div>
        ))}
      </dl>
      {folds && (
        <button
          type="button"
          className="title-block-more"
          aria-expanded={open}
          aria-controls={listId}
          onClick={() => setOpen(!open)}
        >
          Full title block
          <svg viewBox="0 0 10 6" width="10" height="6" aria-hidden="true">
            <path d="M1 1 5 5 9 1" fill="none" stroke="currentColor" strokeWidth="1.6" />
          </svg>
        </button>
      )}
    </div>
  );
}

/** The same cells as a full-width band of facts. */
export function Facts({ cells }: TitleBlockProps) {
  return (
    <dl className="facts">
      {placeCells(cells).map((cell) => (
        <div key={cell.label} className={cell.className}>
          <dt>{cell.label}</dt>
          <dd>{cell.value}</dd>
        </div>
      ))}
    </dl>
  );
}

import { type ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { Quantity } from '../../ui/quantity.tsx';
import { Lamp } from '../../ui/symbols/lamp.tsx';
import { RevisedSign } from '../../ui/symbols/signs.tsx';
import { Terminal } from '../../ui/symbols/terminal.tsx';
import {
  lastLiveSheet,
  paperPath,
  sayPaper,
  saySheetState,
  sayWorksheet,
  terminalOf,
} from './map-words.ts';
import { type PaperView, type SheetView, type UnitView, type WorksheetOfUnit } from './queries.ts';

interface UnitWayProps {
  unit: UnitView;
  /** The sheet to carry on with, wherever it is. */
  currentSheet: string | null;
}

/** One circuit of the map: off the busbar, past its sheets, to the lamp of its worksheet. */
export function UnitWay({ unit, currentSheet }: UnitWayProps) {
  const live = lastLiveSheet(unit);
  const isLit = unit.worksheet?.lit ?? false;
  const state = [isLit && 'lit', !unit.issued && 'not-issued'].filter(Boolean).join(' ');
  return (
    <Way id={`unit-${unit.number}`} number={unit.number} title={unit.title} className={state}>
      {unit.issued ? (
        <ol>
          {unit.sheets.map((sheet, index) => (
            <li key={sheet.number} className={index <= live || isLit ? 'on' : undefined}>
              <SheetLink sheet={sheet} isHere={sheet.number === currentSheet} />
            </li>
          ))}
        </ol>
      ) : (
        <p className="way-note">Not yet issued</p>
      )}
      {unit.worksheet && <WorksheetLoad worksheet={unit.worksheet} />}
    </Way>
  );
}

interface WayProps {
  id: string;
  number: ReactNode;
  title: string;
  className?: string;
  children: ReactNode;
}

function Way({ id, number, title, className = '', children }: WayProps) {
  return (
    <section className={`way ${className}`} id={id} aria-labelledby={`${id}-title`}>
      <Drop isOpen={className.includes('not-issued')} />
      <h2 id={`${id}-title`}>
        <b>{number}</b> <span>{title}</span>
      </h2>
      {children}
    </section>
  );
}

/** From the busbar into the way; an open blade where nothing is issued yet. */
function Drop({ isOpen }: { isOpen: boolean }) {
  return (
    <svg className="drop" viewBox="0 0 24 46" width="24" height="46" aria-hidden="true">
      {isOpen ? (
        <>
          <path className="way-off" d="M11.5 46V34L.5 13M11.5 10V0" />
          <circle className="way-node off" cx="11.5" cy="10" r="2.6" />
        </>
      ) : (
        <path className="way-on" d="M11.5 0V46" />
      )}
      <circle className="way-node" cx="11.5" cy="0" r="5" />
    </svg>
  );
}

function SheetLink({ sheet, isHere }: { sheet: SheetView; isHere: boolean }) {
  return (
    <Link to={`/sheets/${sheet.number}`} className={`way-sheet ${terminalOf(sheet)}`}>
      <Terminal state={terminalOf(sheet)} />
      <span>
        <b>{sheet.number}</b>
        {sheet.revised && <RevisedSign letter={sheet.revised.to} />}{' '}
        <span className="way-title">{sheet.title}</span>
        <span className="visually-hidden">, {saySheetState(sheet)}</span>
        {sheet.revised && <small>Revised, read again</small>}
        {isHere && !sheet.revised && <small>You are here</small>}
      </span>
    </Link>
  );
}

function WorksheetLoad({ worksheet }: { worksheet: WorksheetOfUnit }) {
  const { percent, word } = sayWorksheet(worksheet);
  const to = worksheet.openAttemptId
    ? `/worksheet-attempts/${worksheet.openAttemptId}`
    : `/worksheets/${worksheet.number}`;
  return (
    <p className="way-load">
      <Lamp lit={worksheet.lit} />
      <span>
        <Link to={to}>Worksheet {worksheet.number}</Link>
        <span>
          {percent !== null && (
            <b className={worksheet.lit ? 'passed' : undefined}>
              <Quantity value={percent} unit="%" />
            </b>
          )}
          {percent !== null && ', '}
          {word}
        </span>
      </span>
    </p>
  );
}

/** The last way: the paper that the certificate stands on. */
export function PaperWay({ paper }: { paper: PaperView }) {
  const isPassed = paper.state === 'passed';
  return (
    <Way id="paper" number="P" title={paper.title} className={isPassed ? 'lit' : ''}>
      <p className="way-note on" />
      <p className="way-load">
        <Lamp lit={isPassed} />
        <span>
          <Link to={paperPath(paper)}>Paper {paper.number}</Link>
          <span className={isPassed ? 'passed' : undefined}>{sayPaper(paper)}</span>
        </span>
      </p>
    </Way>
  );
}

import { type CSSProperties } from 'react';
import { Line } from '../line.tsx';
import { PenCross, PenTick } from '../symbols/signs.tsx';
import { InlineMarkdown } from './inline-markdown.tsx';
import { isListed, ListedColumn } from './marked-list.tsx';
import './marked.css';
import { type MarkedPartView, type MarkedQuestionView, type PartView } from './views.ts';
import { isSentThere, WhatToLookAt } from './what-to-look-at.tsx';

type Lines = MarkedPartView['yours'];
type Remark = MarkedPartView['remarks'][number];

interface MarkedQuestionProps {
  marked: MarkedQuestionView;
  /** The parts as they were asked: what was listed is ticked or crossed line by line. */
  asked: readonly PartView[];
  /** Whose answers they are, when they are not the reader's. */
  whose?: string;
}

/** A marked question, part by part: yours, worked, marker. */
export function MarkedQuestion({ marked, asked, whose = 'Yours' }: MarkedQuestionProps) {
  return (
    <div className="marked">
      <div className="marked-head" aria-hidden="true">
        <span>{whose}</span>
        <span>Worked</span>
        <span>Marker</span>
      </div>
      {marked.parts.map((part, index) => (
        <MarkedPart
          key={part.id}
          part={part}
          kind={asked.find(({ id }) => id === part.id)?.kind ?? 'quantity'}
          whose={whose}
          isSentAbove={isSentThere(marked.parts.slice(0, index), part)}
          strokesBefore={countStrokes(marked, index)}
        />
      ))}
    </div>
  );
}

/** Strokes of the pen in the parts before this one: they are drawn one after the other. */
function countStrokes({ parts }: MarkedQuestionView, before: number): number {
  const remarks = parts.slice(0, before).flatMap((part) => part.remarks);
  return remarks.filter(({ sign }) => sign !== 'note').length;
}

interface MarkedPartProps {
  part: MarkedPartView;
  kind: PartView['kind'];
  whose: string;
  isSentAbove: boolean;
  strokesBefore: number;
}

function MarkedPart({ part, kind, whose, isSentAbove, strokesBefore }: MarkedPartProps) {
  const lines = Math.max(part.yours.length, part.worked.length, 1);
  const vars = { '--lines': lines } as CSSProperties;
  return (
    <div className="marked-part" role="group" aria-label={`Part ${part.id}`} style={vars}>
      <h3>
        <b>({part.id})</b> <InlineMarkdown>{part.prompt}</InlineMarkdown>
      </h3>
      {isListed(kind) ? (
        <>
          <ListedColumn heading={whose} part={part} kind={kind} />
          <WorkingColumn className="worked listed" heading="Worked" lines={part.worked} />
        </>
      ) : (
        <>
          <WorkingColumn className="yours" heading={whose} lines={part.yours} />
          <WorkingColumn className="worked" heading="Worked" lines={part.worked} />
        </>
      )}
      <div className="marker">
        <div>
          {part.remarks.map((remark, index) => (
            <RemarkLine key={index} remark={remark} stroke={strokesBefore + index} />
          ))}
          <WhatToLookAt part={part} isSaidAbove={isSentAbove} />
        </div>
        <p className="part-mark">
          {part.marks}
          <span className="visually-hidden"> of </span>
          <i>/{part.outOf}</i>
        </p>
      </div>
    </div>
  );
}

interface WorkingColumnProps {
  className: string;
  heading: string;
  lines: Lines;
}

function WorkingColumn({ className, heading, lines }: WorkingColumnProps) {
  return (
    <div className={className}>
      <h4 className="visually-hidden">{heading}</h4>
      {lines.length === 0 && <p className="muted">nothing written</p>}
      {lines.map((tokens, index) => (
        <p key={index}>
          <Line tokens={tokens} />
        </p>
      ))}
    </div>
  );
}

const signSaid = { gained: 'Mark gained: ', lost: 'Mark lost: ', note: '' } as const;

interface RemarkLineProps {
  remark: Remark;
  /** Which stroke of the pen it is, from the top of the paper. */
  stroke: number;
}

function RemarkLine({ remark, stroke }: RemarkLineProps) {
  return (
    <p className="remark" style={{ '--stroke': stroke } as CSSProperties}>
      {remark.sign === 'gained' && <PenTick />}
      {remark.sign === 'lost' && <PenCross />}
      <span>
        <span className="visually-hidden">{signSaid[remark.sign]}</span>
        {remark.heading && <b>{remark.heading}</b>}
        <InlineMarkdown>{remark.text}</InlineMarkdown>
      </span>
    </p>
  );
}

import { Line } from '../line.tsx';
import { PenCross, PenTick } from '../symbols/signs.tsx';
import { InlineMarkdown } from './inline-markdown.tsx';
import './marked.css';
import { type MarkedPartView, type MarkedQuestionView } from './views.ts';

type Lines = MarkedPartView['yours'];
type Remark = MarkedPartView['remarks'][number];

/** A marked question, part by part: yours, worked, marker. */
export function MarkedQuestion({ marked }: { marked: MarkedQuestionView }) {
  return (
    <div className="marked">
      <div className="marked-head" aria-hidden="true">
        <span>Yours</span>
        <span>Worked</span>
        <span>Marker</span>
      </div>
      {marked.parts.map((part) => (
        <MarkedPart key={part.id} part={part} />
      ))}
    </div>
  );
}

function MarkedPart({ part }: { part: MarkedPartView }) {
  return (
    <section className="marked-part" aria-label={`Part ${part.id}`}>
      <h3>
        <b>({part.id})</b> <InlineMarkdown>{part.prompt}</InlineMarkdown>
      </h3>
      <WorkingColumn className="yours" heading="Yours" lines={part.yours} />
      <WorkingColumn className="worked" heading="Worked" lines={part.worked} />
      <div className="marker">
        <div>
          {part.remarks.map((remark, index) => (
            <RemarkLine key={index} remark={remark} />
          ))}
        </div>
        <p className="part-mark">
          {part.marks}
          <i>/{part.outOf}</i>
        </p>
      </div>
    </section>
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

function RemarkLine({ remark }: { remark: Remark }) {
  return (
    <p className="remark">
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

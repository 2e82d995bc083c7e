import { type ReactNode } from 'react';
import Markdown from 'react-markdown';
import remarkGfm from 'remark-gfm';
import { Hazard } from '../hazard.tsx';
import { ScrollTable } from '../scroll-table.tsx';
import { GivenTable } from './given-table.tsx';
import { PartEntry } from './part-entry.tsx';
import './question.css';
import { Schematic } from './schematic.tsx';
import { TableExtract } from './table-extract.tsx';
import { type Answers, type PartView, type QuestionView, type RawAnswer } from './views.ts';
import { type Lines, WorkedLines, WorkedPart } from './worked-part.tsx';

interface FadedView {
  shown: readonly { part: string; lines: Lines }[];
  asked: readonly string[];
}

interface QuestionCardProps {
  question: QuestionView;
  answers: Answers;
  /** By part id: what is asked back. */
  unclear?: Record<string, string>;
  readOnly?: boolean;
  /** Drawn between the given values and the parts: the curve of a curve reading. */
  curve?: ReactNode;
  /** What is worked already, and which parts are left to answer; all of them without it. */
  faded?: FadedView | null;
  /** What stands under the prompt of a part. */
  aside?: (part: PartView) => ReactNode;
  onChange: (part: string, answer: RawAnswer) => void;
  onLeave?: (part: string) => void;
}

/** A question as it is answered: given values, drawing, cautions, lettered parts with their marks. */
export function QuestionCard({
  question,
  answers,
  unclear = {},
  faded,
  ...props
}: QuestionCardProps) {
  return (
    <div className="question">
      <QuestionFacts question={question} />
      {props.curve}
      <ol className="parts">
        {question.parts.map((part) => {
          const lines = faded?.shown.find((shown) => shown.part === part.id)?.lines ?? [];
          if (faded && !faded.asked.includes(part.id)) {
            return <WorkedPart key={part.id} part={part} lines={lines} />;
          }
          return (
            <PartEntry
              key={part.id}
              part={part}
              answer={answers[part.id]}
              unclear={unclear[part.id]}
              readOnly={props.readOnly ?? false}
              aside={
                <>
                  {lines.length > 0 && <WorkedLines label="Worked as far as here" lines={lines} />}
                  {props.aside?.(part)}
                </>
              }
              onChange={(answer) => props.onChange(part.id, answer)}
              onLeave={() => props.onLeave?.(part.id)}
            />
          );
        })}
      </ol>
    </div>
  );
}

/** All that a question states before it asks anything. */
export function QuestionFacts({ question }: { question: QuestionView }) {
  return (
    <div className="question-facts">
      {question.body && (
        <div className="question-text">
          <Markdown remarkPlugins={[remarkGfm]} components={{ table: ScrollTable }}>
            {question.body}
          </Markdown>
        </div>
      )}
      {question.given.length > 0 && <GivenTable given={question.given} />}
      {question.diagram && <Schematic diagram={question.diagram} />}
      {question.tables.map((table) => (
        <TableExtract key={table.caption} table={table} />
      ))}
      {question.cautions.map((caution) => (
        <Hazard key={caution.title} level={caution.level} title={caution.title}>
          <Markdown>{caution.text}</Markdown>
        </Hazard>
      ))}
      <p className="question-profile fine">
        {question.profile === 'metric' ? 'Metric practice' : 'AWG practice'}
        {question.aids.length > 0 && <>. You may use: {question.aids.join(', ')}</>}. Your local
        code decides.
      </p>
    </div>
  );
}

import { lazy, Suspense, use } from 'react';
import Markdown from 'react-markdown';
import { Line } from '../../ui/line.tsx';
import { GivenTable } from '../../ui/question/given-table.tsx';
import { InlineMarkdown } from '../../ui/question/inline-markdown.tsx';
import { Schematic } from '../../ui/question/schematic.tsx';
import { TableExtract } from '../../ui/question/table-extract.tsx';
import { RuledLines } from '../../ui/states.tsx';
import { LessonContext } from './lesson-context.ts';

// Few worked examples have a curve.
const CurveReader = lazy(() =>
  import('../../ui/question/curve-reader.tsx').then((part) => ({ default: part.CurveReader })),
);

interface WorkedExampleProps {
  question: string;
  seed: string;
}

/** A practice question worked line by line, its figures fixed by the sheet. */
export function WorkedExample({ question, seed }: WorkedExampleProps) {
  const worked = use(LessonContext).worked[`${question}#${seed}`];
  if (!worked) return null;
  return (
    <section className="worked-example" aria-label={`Worked example: ${worked.title}`}>
      <header>
        <p className="kicker">Worked example</p>
        <h3>{worked.title}</h3>
        <Markdown>{worked.lead}</Markdown>
      </header>
      {(worked.given.length > 0 || worked.diagram || worked.tables.length > 0) && (
        <div className="worked-given">
          {worked.given.length > 0 && <GivenTable given={worked.given} />}
          {worked.diagram && <Schematic diagram={worked.diagram} />}
          {worked.tables.map((table) => (
            <TableExtract key={table.caption} table={table} />
          ))}
        </div>
      )}
      {worked.curve && (
        <Suspense fallback={<RuledLines what="the curve" />}>
          <CurveReader curve={worked.curve} />
        </Suspense>
      )}
      <ol className="worked-steps">
        {worked.parts.map((part) => (
          <li key={part.id}>
            <span className="worked-letter">({part.id})</span>
            <span>
              <InlineMarkdown>{part.prompt}</InlineMarkdown>
            </span>
            <div>
              {part.lines.map((tokens, index) => (
                <p key={index}>
                  <Line tokens={tokens} />
                </p>
              ))}
            </div>
          </li>
        ))}
      </ol>
    </section>
  );
}

import { lazy, type ReactNode, Suspense, use } from 'react';
import Markdown, { type Components } from 'react-markdown';
import remarkDirective from 'remark-directive';
import remarkGfm from 'remark-gfm';
import remarkMath from 'remark-math';
import { Hazard, type HazardLevel } from '../../ui/hazard.tsx';
import { ScrollTable } from '../../ui/scroll-table.tsx';
import { RuledLines } from '../../ui/states.tsx';
import { layOutSheet } from './lay-out-sheet.ts';
import { LessonContext } from './lesson-context.ts';
import { LessonFigure } from './lesson-figure.tsx';
import { markTerms } from './mark-terms.ts';
import { type LessonView } from './queries.ts';
import { TermNote } from './term-note.tsx';
import { DrawnTree } from './tree.tsx';
import { TryQuestion } from './try-question.tsx';
import { WorkedExample } from './worked-example.tsx';

const LessonDrawing = lazy(() =>
  import('./drawings/lesson-drawing.tsx').then((part) => ({ default: part.LessonDrawing })),
);

interface RowProps {
  paragraph?: number;
  children?: ReactNode;
}

/** A numbered paragraph with what stands beside it; people quote the number. */
function SheetRow({ paragraph, children }: RowProps) {
  const { named } = use(LessonContext);
  if (!paragraph) return <div className="sheet-row">{children}</div>;
  return (
    <div
      className={paragraph === named ? 'sheet-row named' : 'sheet-row'}
      id={`p${paragraph}`}
      data-paragraph={paragraph}
      tabIndex={-1}
    >
      <p className="paragraph-number">
        <span className="visually-hidden">Paragraph </span>
        {paragraph}
      </p>
      {children}
    </div>
  );
}

function SheetFormula({ source, display }: { source: string; display?: boolean }) {
  const tree = use(LessonContext).formulas[source];
  const formula = tree ? <DrawnTree tree={tree} /> : <code>{source}</code>;
  return display ? <span className="formula">{formula}</span> : formula;
}

function MarginNote({ title, children }: { title: string; children?: ReactNode }) {
  return (
    <div className="margin-note" role="note">
      <b>{title}</b>
      {children}
    </div>
  );
}

function SheetHazard(props: { level: HazardLevel; title: string; children?: ReactNode }) {
  return (
    <Hazard level={props.level} title={props.title}>
      {props.children}
    </Hazard>
  );
}

function SheetDrawing(props: { kind: string; title: string }) {
  return (
    <Suspense fallback={<RuledLines what="the drawing" />}>
      <LessonDrawing {...props} />
    </Suspense>
  );
}

function LocalCode({ children }: { children?: ReactNode }) {
  return (
    <div className="local-code" role="note">
      <b>Your local code</b>
      {children}
    </div>
  );
}

const components = {
  'sheet-row': SheetRow,
  'sheet-formula': SheetFormula,
  'sheet-margin': MarginNote,
  'sheet-hazard': SheetHazard,
  'sheet-local': LocalCode,
  'sheet-figure': LessonFigure,
  'sheet-drawing': SheetDrawing,
  'sheet-term': TermNote,
  'sheet-worked': WorkedExample,
  'sheet-try': TryQuestion,
  table: ScrollTable,
} as Components;

interface LessonTextProps {
  lesson: LessonView;
  /** The paragraph the address names. */
  named?: number | null;
}

/** The text of a sheet. Raw HTML is never drawn; formulas and figures come with the lesson. */
export function LessonText({ lesson, named = null }: LessonTextProps) {
  return (
    <LessonContext value={{ ...lesson, named }}>
      <Markdown
        remarkPlugins={[
          remarkGfm,
          remarkMath,
          remarkDirective,
          [layOutSheet, { words: lesson.words }],
          [markTerms, lesson.terms],
        ]}
        components={components}
      >
        {lesson.body}
      </Markdown>
    </LessonContext>
  );
}

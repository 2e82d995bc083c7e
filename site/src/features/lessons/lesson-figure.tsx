import { type ReactNode, use } from 'react';
import Markdown from 'react-markdown';
import './drawing.css';
import { LessonContext } from './lesson-context.ts';
import { DrawnTree } from './tree.tsx';

interface LessonFigureProps {
  src: string;
  short: string;
  number: number;
  children?: ReactNode;
}

/** A drawing with its caption; the long description says in words what is drawn. */
export function LessonFigure({ src, short, number, children }: LessonFigureProps) {
  const figure = use(LessonContext).figures[src];
  if (!figure) return null;
  return (
    <figure className="lesson-figure">
      <div className="figure-drawing">
        <div className={figure.narrow ? 'only-wide' : undefined} role="img" aria-label={short}>
          <DrawnTree tree={figure.tree} />
        </div>
        {figure.narrow && (
          <div className="only-narrow" role="img" aria-label={short}>
            <DrawnTree tree={figure.narrow} />
          </div>
        )}
      </div>
      <figcaption>
        <div className="figure-caption">
          <b>Fig. {number}</b> {children}
        </div>
        <details>
          <summary>
            The drawing in words<span className="visually-hidden">, figure {number}</span>
          </summary>
          <Markdown>{figure.long}</Markdown>
        </details>
      </figcaption>
    </figure>
  );
}

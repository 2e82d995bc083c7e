import Markdown from 'react-markdown';
import { type ReactNode } from 'react';
import { type WorksheetItem } from './queries.ts';

interface ItemHeadProps {
  item: WorksheetItem;
  /** Which of how many. */
  place: [number, number];
  /** Instead of the lead: what the marker says in one sentence. */
  says?: string;
  children?: ReactNode;
}

export function ItemHead({ item, place: [place, of], says, children }: ItemHeadProps) {
  const { question, key } = item;
  const marks = `${question.marks} ${question.marks === 1 ? 'mark' : 'marks'}`;
  return (
    <header className="item-head">
      <p className="kicker">{of === 1 ? marks : `Question ${place} of ${of}, ${marks}`}</p>
      <h2 id={`${key}-title`}>{question.title}</h2>
      <Markdown>{says ?? question.lead}</Markdown>
      {children}
    </header>
  );
}

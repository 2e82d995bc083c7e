import { type ReactNode, use, useEffect, useId, useRef, useState } from 'react';
import { Link } from 'react-router-dom';
import './term-note.css';
import { LessonContext } from './lesson-context.ts';

interface TermNoteProps {
  term: string;
  children?: ReactNode;
}

/** A word of the glossary where it first stands: pressed, it explains itself. */
export function TermNote({ term, children }: TermNoteProps) {
  const means = use(LessonContext).terms.find((one) => one.term === term)?.means;
  const noteId = useId();
  const { isOpen, setOpen, wordRef } = useOpenNote();
  if (!means) return children;
  return (
    <span className="term" ref={wordRef}>
      <button
        type="button"
        aria-expanded={isOpen}
        aria-controls={noteId}
        aria-describedby={noteId}
        onClick={() => setOpen(!isOpen)}
      >
        {children}
      </button>
      <span className="term-note" id={noteId} hidden={!isOpen}>
        <b>{term}</b> {means}{' '}
        {isOpen && <Link to={`/glossary#${anchorOf(term)}`}>In the glossary</Link>}
      </span>
    </span>
  );
}

/** Letters and figures, the rest a hyphen: as the glossary names its places. */
function anchorOf(term: string): string {
  const words = term.toLowerCase().match(/[\p{L}\p{N}]+/gu);
  return (words ?? []).join('-');
}

/** Escape, a press elsewhere or moving on closes it. */
function useOpenNote() {
  const [isOpen, setOpen] = useState(false);
  const wordRef = useRef<HTMLSpanElement>(null);
  useEffect(() => {
    if (!isOpen) return undefined;
    const leave = ({ target }: Event) => {
      if (!wordRef.current?.contains(target as Node)) setOpen(false);
    };
    const escape = ({ key }: KeyboardEvent) => {
      if (key !== 'Escape') return;
      setOpen(false);
      wordRef.current?.querySelector('button')?.focus();
    };
    document.addEventListener('pointerdown', leave);
    document.addEventListener('focusin', leave);
    document.addEventListener('keydown', escape);
    return () => {
      document.removeEventListener('pointerdown', leave);
      document.removeEventListener('focusin', leave);
      document.removeEventListener('keydown', escape);
    };
  }, [isOpen]);
  return { isOpen, setOpen, wordRef };
}

import { useQuery } from '@tanstack/react-query';
import { type KeyboardEvent, useEffect, useId, useState } from 'react';
import { useNavigate } from 'react-router-dom';
import { longestQuery, type Result, searchPath, searchQuery } from './queries.ts';
import { sayPlace, Snippet } from './snippet.tsx';

const restMs = 200;
const shortest = 2;
const mostShown = 8;

/** Typing shows the best places; arrows move among them, Enter opens, Escape closes. */
export function SearchField() {
  const [typed, setTyped] = useState('');
  const [isOpen, setOpen] = useState(false);
  const [at, setAt] = useState(-1);
  const listId = useId();
  const results = useBestResults(typed);
  const navigate = useNavigate();
  const isShown = isOpen && results.length > 0;
  const open = (to: string) => {
    setOpen(false);
    setAt(-1);
    void navigate(to);
  };
  const press = (event: KeyboardEvent<HTMLInputElement>) => {
    const way = { ArrowDown: 1, ArrowUp: -1 }[event.key];
    if (way !== undefined && isShown) {
      event.preventDefault();
      setAt(stepIn(results.length, at, way));
    }
    if (event.key === 'Escape') {
      if (!isShown) setTyped('');
      setOpen(false);
      setAt(-1);
    }
    if (event.key === 'Enter' && typed.trim()) {
      event.preventDefault();
      open((isShown && results[at]?.link) || searchPath(typed.trim()));
    }
  };
  return (
    <div className="search-field">
      <input
        className="entry"
        type="text"
        inputMode="search"
        role="combobox"
        aria-label="Search sheets, tables and glossary"
        aria-expanded={isShown}
        aria-controls={listId}
        aria-autocomplete="list"
        aria-keyshortcuts="/"
        aria-activedescendant={isShown && at >= 0 ? `${listId}-${at}` : undefined}
        placeholder="Search, key /"
        autoComplete="off"
        maxLength={longestQuery}
        value={typed}
        onChange={(event) => {
          setTyped(event.target.value);
          setOpen(true);
          setAt(-1);
        }}
        onFocus={() => setOpen(true)}
        onBlur={() => setOpen(false)}
        onKeyDown={press}
      />
      <ul className="search-list" id={listId} role="listbox" aria-label="Found" hidden={!isShown}>
        {isShown &&
          results.map((result, index) => (
            <FoundOption
              key={`${result.link} ${result.title}`}
              id={`${listId}-${index}`}
              result={result}
              isAt={index === at}
              onOpen={() => open(result.link)}
            />
          ))}
      </ul>
      <span className="visually-hidden" role="status">
        {isShown ? `${results.length} places. Arrows move among them.` : ''}
      </span>
    </div>
  );
}

interface FoundOptionProps {
  id: string;
  result: Result;
  isAt: boolean;
  onOpen: () => void;
}

function FoundOption({ id, result, isAt, onOpen }: FoundOptionProps) {
  return (
    // The field keeps the focus and the keys; a press is for the mouse and the finger.
    // eslint-disable-next-line jsx-a11y/click-events-have-key-events
    <li
      id={id}
      role="option"
      aria-selected={isAt}
      onPointerDown={(event) => event.preventDefault()}
      onClick={onOpen}
    >
      <b>{result.title}</b> <small>{sayPlace(result)}</small>
      <span>
        <Snippet snippet={result.snippet} />
      </span>
    </li>
  );
}

/** Round and round; -1 is the field itself. */
function stepIn(count: number, at: number, way: number): number {
  const next = at + way;
  if (next < -1) return count - 1;
  return next >= count ? -1 : next;
}

/** What fits a list under the field, once typing has rested; the last list stays meanwhile. */
function useBestResults(typed: string): Result[] {
  const [words, setWords] = useState('');
  useEffect(() => {
    const timer = setTimeout(() => setWords(typed.trim()), restMs);
    return () => clearTimeout(timer);
  }, [typed]);
  const { data } = useQuery({
    ...searchQuery(words),
    enabled: words.length >= shortest,
    placeholderData: (last) => last,
  });
  return typed.trim().length < shortest ? [] : (data?.results ?? []).slice(0, mostShown);
}

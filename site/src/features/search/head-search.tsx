import { useEffect, useRef } from 'react';
import { Link, useLocation, useNavigate } from 'react-router-dom';
import './search.css';
import { SearchField } from './search-field.tsx';

/** In the running head: a field where there is room, else the word. "/" goes there. */
export function HeadSearch() {
  const fieldRef = useRef<HTMLDivElement>(null);
  const navigate = useNavigate();
  const isOnPage = useLocation().pathname === '/search';
  useEffect(() => {
    const go = (event: KeyboardEvent) => {
      if (!asksToSearch(event)) return;
      event.preventDefault();
      const field = fieldRef.current?.querySelector('input');
      // On a narrow page the field is not drawn and cannot take the focus.
      field?.focus();
      if (!field || document.activeElement !== field)
        void navigate('/search', { state: { isTyping: true } });
    };
    document.addEventListener('keydown', go);
    return () => document.removeEventListener('keydown', go);
  }, [navigate]);
  return (
    <div className="head-search" role={isOnPage ? undefined : 'search'} ref={fieldRef}>
      {!isOnPage && <SearchField />}
      <Link className="head-search-word" to="/search">
        Search
      </Link>
    </div>
  );
}

/** "/" alone, and not as part of what is being written. */
function asksToSearch({ key, ctrlKey, metaKey, altKey, target }: KeyboardEvent): boolean {
  return key === '/' && !ctrlKey && !metaKey && !altKey && !isTyping(target);
}

function isTyping(target: EventTarget | null): boolean {
  return (
    target instanceof HTMLElement &&
    (target.isContentEditable || /^(INPUT|TEXTAREA|SELECT)$/.test(target.tagName))
  );
}

import { useEffect } from 'react';
import { useLocation } from 'react-router-dom';

/** "#p7" names paragraph 7: it is brought into sight, and reading begins there. */
export function useNamedParagraph(): number | null {
  const { hash, key } = useLocation();
  const named = /^#p(\d{1,3})$/.exec(hash)?.[1];
  useEffect(() => {
    const row = named && document.getElementById(`p${named}`);
    if (!row) return;
    row.scrollIntoView({ block: 'start' });
    row.focus({ preventScroll: true });
    // The key too: the same link may be followed twice.
  }, [named, key]);
  return named ? Number(named) : null;
}

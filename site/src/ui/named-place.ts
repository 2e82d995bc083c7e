import { useEffect } from 'react';
import { useLocation } from 'react-router-dom';

/** Brings the place that the address names into sight once the faces have come and nothing moves. */
export function useNamedPlace(): void {
  const { hash, key } = useLocation();
  useEffect(() => {
    const named = hash.length > 1 && document.getElementById(readHash(hash));
    if (!named) return undefined;
    let isLeft = false;
    const show = () => {
      if (!isLeft) named.scrollIntoView({ block: 'start' });
    };
    if ('fonts' in document) void document.fonts.ready.then(show);
    return () => {
      isLeft = true;
    };
    // The key too: the same link may be followed twice.
  }, [hash, key]);
}

/** A broken escape names nothing. */
function readHash(hash: string): string {
  try {
    return decodeURIComponent(hash.slice(1));
  } catch {
    return '';
  }
}

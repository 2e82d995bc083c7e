import { type ReactNode, useSyncExternalStore } from 'react';
import { SwitchSign } from './symbols/signs.tsx';

interface StripProps {
  kind: 'lost' | 'back' | 'short-of-time' | 'said';
  children: ReactNode;
  /** Runs across the sheet, from edge to edge. */
  across?: boolean;
}

/** Says what the signal, the clock or the server is doing. */
export function Strip({ kind, children, across = false }: StripProps) {
  return (
    <div
      className={`strip ${kind}${across ? ' across' : ''}`}
      role={kind === 'short-of-time' ? 'alert' : 'status'}
    >
      {kind === 'lost' && <SwitchSign open />}
      {kind === 'back' && <SwitchSign open={false} />}
      <div>{children}</div>
    </div>
  );
}

function watchSignal(changed: () => void) {
  window.addEventListener('online', changed);
  window.addEventListener('offline', changed);
  return () => {
    window.removeEventListener('online', changed);
    window.removeEventListener('offline', changed);
  };
}

export function useSignal(): boolean {
  return useSyncExternalStore(watchSignal, () => navigator.onLine);
}

/** Small signs that stand before a word. The word says the same: none of them speaks alone. */
interface SignProps {
  className?: string;
}

export function TickSign({ className = '' }: SignProps) {
  return (
    <svg className={`icon ${className}`} viewBox="0 0 14 14" width="13" height="13" aria-hidden>
      <path d="M2 7.5 5.5 11 12 3.5" fill="none" stroke="currentColor" strokeWidth="2" />
    </svg>
  );
}

export function StruckSign({ className = '' }: SignProps) {
  return (
    <svg className={`icon ${className}`} viewBox="0 0 14 14" width="13" height="13" aria-hidden>
      <path d="M2 12 12 2" stroke="currentColor" strokeWidth="2" />
      <circle cx="7" cy="7" r="5.6" fill="none" stroke="currentColor" strokeWidth="1.6" />
    </svg>
  );
}

export function OpenRingSign({ className = '' }: SignProps) {
  return (
    <svg className={`icon ${className}`} viewBox="0 0 14 14" width="13" height="13" aria-hidden>
      <path d="M7 1.4A5.6 5.6 0 1 0 12.6 7" fill="none" stroke="currentColor" strokeWidth="1.8" />
    </svg>
  );
}

/** A switch: open for no signal, closed for signal back. */
export function SwitchSign({ open }: { open: boolean }) {
  return (
    <svg viewBox="0 0 36 20" width="36" height="20" aria-hidden="true">
      <path
        d={open ? 'M1 14H9M27 14H35M11 13L25 4' : 'M1 14H9M27 14H35M12 14H24'}
        fill="none"
        stroke="currentColor"
        strokeWidth="2"
      />
      <circle cx="10" cy="14" r="2.4" fill="none" stroke="currentColor" strokeWidth="1.8" />
      <circle cx="26" cy="14" r="2.4" fill="none" stroke="currentColor" strokeWidth="1.8" />
    </svg>
  );
}

export function PennantSign() {
  return (
    <svg className="pen" viewBox="0 0 14 16" width="13" height="15" aria-hidden="true">
      <path d="M2 1V15.5" stroke="currentColor" strokeWidth="2" fill="none" />
      <path d="M3 1.5 13 5.2 3 9Z" fill="currentColor" />
    </svg>
  );
}

/** The marker's strokes. */
export function PenTick() {
  return (
    <svg className="pen-tick" viewBox="0 0 26 24" width="30" height="28" aria-hidden="true">
      <path d="M2 13.6C4.6 15.4 7 18 8.8 21.6 12 13.4 17 6.8 24.6 1.6 17.4 4.6 12 9.6 8.6 16.2 7 14.2 4.6 13.2 2 13.6Z" />
    </svg>
  );
}

export function PenCross() {
  return (
    <svg className="pen-cross" viewBox="0 0 24 24" width="25" height="25" aria-hidden="true">
      <path d="M1.8 3.4C8.8 7.6 15.6 14 22 21.8 14.2 16.8 7 10.8 1.8 3.4Z" />
      <path d="M21.8 1.6C16.6 10 10 16.8 2 22 7.2 13.8 13.4 7.2 21.8 1.6Z" />
    </svg>
  );
}

/** A sheet has a newer revision than the one that was read. */
export function RevisedSign({ letter }: { letter: string }) {
  return (
    <svg className="revised-sign" viewBox="0 0 20 18" width="20" height="18" aria-hidden="true">
      <path d="M10 1 19 17H1Z" />
      <text x="10" y="14.4" textAnchor="middle">
        {letter}
      </text>
    </svg>
  );
}

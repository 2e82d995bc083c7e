import { type ReactNode } from 'react';

export type HazardLevel = 'danger' | 'warning' | 'caution' | 'notice' | 'mandatory';

interface HazardProps {
  level: HazardLevel;
  title: string;
  children: ReactNode;
}

/** A caution panel after ISO 3864: signal word, what the danger is, what to do. */
export function Hazard({ level, title, children }: HazardProps) {
  const isAlert = level === 'danger' || level === 'warning' || level === 'caution';
  return (
    <div className={`hazard ${level}`} role="note">
      <p className="hazard-word">
        {isAlert ? <WarningTriangle /> : <MandatoryDisc />}
        {level.toUpperCase()}
      </p>
      <div className="hazard-body">
        <b>{title}</b>
        {children}
      </div>
    </div>
  );
}

function WarningTriangle() {
  return (
    <svg viewBox="0 0 24 21" aria-hidden="true">
      <path
        d="M12 1.2 23 20H1Z"
        fill="#F9A800"
        stroke="#111"
        strokeWidth="1.8"
        strokeLinejoin="round"
      />
      <path d="M11 7h2l-.35 7h-1.3Z" fill="#111" />
      <circle cx="12" cy="16.6" r="1.2" fill="#111" />
    </svg>
  );
}

function MandatoryDisc() {
  return (
    <svg viewBox="0 0 24 24" aria-hidden="true">
      <circle cx="12" cy="12" r="11" fill="none" stroke="#fff" strokeWidth="1.6" />
      <path d="M11 5h2l-.35 9h-1.3Z" fill="#fff" />
      <circle cx="12" cy="17" r="1.4" fill="#fff" />
    </svg>
  );
}

import { Ferrule } from './ferrule.tsx';

export type TerminalState = 'open' | 'begun' | 'done';

interface TerminalProps {
  state: TerminalState;
  width?: number;
}

/** A terminal: empty, with a ferrule offered up, or with the ferrule seated. Say the state in text beside it. */
export function Terminal({ state, width = 62 }: TerminalProps) {
  return (
    <svg
      className={`terminal ${state}`}
      viewBox="0 0 62 28"
      width={width}
      height={(width * 28) / 62}
      aria-hidden="true"
    >
      <circle cx="11.5" cy="14" r="7.5" className="terminal-ring" />
      {state === 'done' && (
        <>
          <path className="terminal-tail" d="M49 14H56" />
          <Ferrule x={7.5} y={14} scale={0.98} />
        </>
      )}
      {state === 'begun' && <Ferrule x={20} y={14} scale={0.86} />}
    </svg>
  );
}

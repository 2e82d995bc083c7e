import { Link } from 'react-router-dom';
import { nameLeft } from './words.ts';

interface FadingRowProps {
  /** How many of the last steps may be left, from none to all. */
  levels: readonly number[];
  left: number;
}

/** How much of the question is left to do: seen worked, its last steps, the whole. */
export function FadingRow({ levels, left }: FadingRowProps) {
  const all = levels.at(-1) ?? 0;
  return (
    <nav className="fading-row not-printed" aria-label="How much is left to you">
      <span aria-hidden="true">Left to you</span>
      <ol>
        {levels.map((level) => (
          <li key={level}>
            <Link
              to={level === all ? '?' : `?left=${level}`}
              replace
              preventScrollReset
              aria-current={level === left ? 'true' : undefined}
            >
              {nameLeft(level, all)}
            </Link>
          </li>
        ))}
      </ol>
    </nav>
  );
}

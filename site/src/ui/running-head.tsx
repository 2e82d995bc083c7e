import { type ReactNode, useState } from 'react';
import { NavLink, useLocation } from 'react-router-dom';
import { Wordmark } from './wordmark.tsx';

interface RunningHeadProps {
  links?: { label: string; to: string }[];
  /** Right of the head, always in sight: a saved state, a clock, a link. */
  end?: ReactNode;
  /** The name and sign-out; on a phone they fold behind "Menu" with the words. */
  own?: ReactNode;
}

/** Mark, at most five words of navigation, and who is here. On a phone the words fold behind "Menu". */
export function RunningHead({ links = [], end, own }: RunningHeadProps) {
  const { pathname } = useLocation();
  const [openOn, setOpenOn] = useState<string | null>(null);
  // Opened on one page, it is closed on the next.
  const open = openOn === pathname;
  return (
    <header className={open ? 'running-head open' : 'running-head'}>
      <Wordmark />
      <nav aria-label="Main" id="main-navigation">
        <ul>
          {links.map((link) => (
            <li key={link.to}>
              <NavLink to={link.to}>{link.label}</NavLink>
            </li>
          ))}
        </ul>
      </nav>
      <div className="running-head-end">
        {end}
        {own && <div className="running-head-own">{own}</div>}
        {links.length > 0 && (
          <button
            type="button"
            className="menu-button"
            aria-expanded={open}
            aria-controls="main-navigation"
            onClick={() => setOpenOn(open ? null : pathname)}
          >
            Menu
          </button>
        )}
      </div>
    </header>
  );
}

import { Theme } from '@radix-ui/themes';
import { useEffect, useRef } from 'react';
import { Outlet, ScrollRestoration, useLocation, useNavigation } from 'react-router-dom';
import { useAppearance } from '../ui/color-scheme.ts';
import { focusOnHeading } from '../ui/focus-on-heading.ts';
import { Strip, useSignal } from '../ui/strip.tsx';

/** What every page shares: theme, skip link, signal, and where the focus goes on arrival. */
export function Root() {
  const isBusy = useNavigation().state !== 'idle';
  useFocusOnArrival();
  return (
    <Theme
      appearance={useAppearance()}
      accentColor="bronze"
      grayColor="sand"
      panelBackground="solid"
      radius="small"
      aria-busy={isBusy || undefined}
    >
      <a className="skip-link" href="#content">
        To the sheet
      </a>
      <SignalStrip />
      <Outlet />
      <ScrollRestoration />
    </Theme>
  );
}

function SignalStrip() {
  const hasSignal = useSignal();
  const { pathname } = useLocation();
  if (hasSignal || isBeingSat(pathname)) return null;
  return (
    <Strip kind="lost" across>
      <b>No signal.</b> What is on this page can still be read. Papers, certificate checks and
      handing in wait for a signal.
    </Strip>
  );
}

/** A paper being sat says itself what the signal means for it. */
const isBeingSat = (pathname: string) => /^\/sittings\/[^/]+(\/review)?$/.test(pathname);

/**
 * A new page begins at its heading, for the keyboard and for a screen reader alike; where the
 * address names a paragraph, the page itself begins there.
 */
function useFocusOnArrival() {
  const { pathname, hash } = useLocation();
  const isFirst = useRef(true);
  const namesParagraph = /^#p\d+$/.test(hash);
  useEffect(() => {
    if (isFirst.current) {
      isFirst.current = false;
      return;
    }
    if (!namesParagraph) focusOnHeading({ preventScroll: true });
  }, [pathname, namesParagraph]);
}

import { useEffect, useRef } from 'react';

/** Reading begins at the heading of what has just come, for the keyboard and a screen reader. */
export function focusOnHeading(options?: FocusOptions): void {
  const heading = document.querySelector<HTMLElement>('main h1');
  heading?.setAttribute('tabindex', '-1');
  heading?.focus(options);
}

/** The heading that was waited at gives way to the answer's: whoever was there reads on from it. */
export function useFocusAfterWait(isAnswered: boolean): void {
  const hasWaited = useRef(false);
  useEffect(() => {
    const wasWaiting = hasWaited.current;
    hasWaited.current = !isAnswered;
    const isFocusLost = document.activeElement === document.body;
    if (isAnswered && wasWaiting && isFocusLost) focusOnHeading({ preventScroll: true });
  }, [isAnswered]);
}

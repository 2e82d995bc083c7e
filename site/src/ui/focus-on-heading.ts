/** Reading begins at the heading of what has just come, for the keyboard and a screen reader. */
export function focusOnHeading(options?: FocusOptions): void {
  const heading = document.querySelector<HTMLElement>('main h1');
  heading?.setAttribute('tabindex', '-1');
  heading?.focus(options);
}

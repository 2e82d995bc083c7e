import { type ReactNode } from 'react';

/** A table of running text. A wide one scrolls sideways on a phone, so the keyboard must reach it. */
export function ScrollTable({ children }: { children?: ReactNode }) {
  return (
    // eslint-disable-next-line jsx-a11y/no-noninteractive-tabindex
    <div className="table-scroll" role="group" aria-label="Table" tabIndex={0}>
      <table>{children}</table>
    </div>
  );
}

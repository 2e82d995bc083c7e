import { type ReactNode } from 'react';

interface ScrollTableProps {
  label?: string;
  children?: ReactNode;
}

/** A table of running text. A wide one scrolls sideways on a phone, so the keyboard must reach it. */
export function ScrollTable({ label = 'Table', children }: ScrollTableProps) {
  return (
    // eslint-disable-next-line jsx-a11y/no-noninteractive-tabindex
    <div className="table-scroll" role="group" aria-label={label} tabIndex={0}>
      <table>{children}</table>
    </div>
  );
}

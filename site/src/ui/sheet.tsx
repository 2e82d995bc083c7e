import { type ReactNode } from 'react';

interface SheetProps {
  children: ReactNode;
  width?: 'full' | 'narrow' | 'wide';
  /** Working screens (tables, desks) drop the zone band and keep the frame. */
  flat?: boolean;
  busy?: boolean;
  className?: string;
  /** Beside the paper: a thumb index. */
  edge?: ReactNode;
}

/** Desk, paper, zone band and frame: what every page stands on. */
export function Sheet({ children, width = 'full', flat = false, ...rest }: SheetProps) {
  return (
    <main
      id="content"
      tabIndex={-1}
      className={['desk', width, rest.className].filter(Boolean).join(' ')}
      aria-busy={rest.busy || undefined}
    >
      <div className={flat ? 'sheet flat' : 'sheet'}>
        {!flat && <Zones across={width === 'narrow' ? 6 : 8} />}
        <div className="frame">{children}</div>
        {rest.edge}
      </div>
    </main>
  );
}

// ISO 5457: zones are lettered without I and O.
const zoneLetters = ['A', 'B', 'C', 'D', 'E', 'F'];

function Zones({ across }: { across: number }) {
  const numbers = Array.from({ length: across }, (_, index) => String(index + 1));
  const band = (side: string, names: string[]) => (
    <div className={`zones ${side}`} aria-hidden="true">
      {names.map((name) => (
        <span key={name}>{name}</span>
      ))}
    </div>
  );
  return (
    <>
      {band('top', numbers)}
      {band('bottom', numbers)}
      {band('left', zoneLetters)}
      {band('right', zoneLetters)}
    </>
  );
}

interface SheetHeadProps {
  kicker?: ReactNode;
  title: ReactNode;
  standfirst?: ReactNode;
  /** Under the standfirst, in the title's column. */
  children?: ReactNode;
  titleBlock?: ReactNode;
}

export function SheetHead({ kicker, title, standfirst, children, titleBlock }: SheetHeadProps) {
  return (
    <header className="sheet-head">
      <div className="sheet-title">
        {kicker && <p className="kicker">{kicker}</p>}
        <h1>{title}</h1>
        {standfirst && <p className="standfirst">{standfirst}</p>}
        {children}
      </div>
      {titleBlock}
    </header>
  );
}

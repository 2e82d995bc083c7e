import { Link } from 'react-router-dom';

export interface SheetLink {
  label: string;
  to: string;
  current?: boolean;
}

interface LinkListProps {
  label: string;
  links: SheetLink[];
}

/** Units down the fore-edge of the sheet; shown where the desk is wide enough for it. */
export function ThumbIndex({ label, links }: LinkListProps) {
  return <LinkList className="thumb-index" label={label} links={links} />;
}

/** Previous, map, next at the foot of a phone. */
export function FootStrip({ label, links }: LinkListProps) {
  return <LinkList className="foot-strip" label={label} links={links} />;
}

function LinkList({ className, label, links }: LinkListProps & { className: string }) {
  return (
    <nav className={className} aria-label={label}>
      <ul>
        {links.map((link) => (
          <li key={link.to}>
            <Link to={link.to} aria-current={link.current ? 'page' : undefined}>
              {link.label}
            </Link>
          </li>
        ))}
      </ul>
    </nav>
  );
}

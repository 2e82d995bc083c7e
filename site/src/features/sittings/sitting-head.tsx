import { Link } from 'react-router-dom';
import { RunningHead } from '../../ui/running-head.tsx';
import { type SittingView } from './queries.ts';

interface BareHeadProps {
  sitting: SittingView;
  /** On a phone, where the foot of the page is far: the way to the other page. */
  to: { label: string; path: string };
}

/** Head of a paper being sat: no navigation, only whose paper it is. */
export function BareHead({ sitting, to }: BareHeadProps) {
  return (
    <RunningHead
      end={
        <>
          <span className="only-wide-inline">{sitting.paper.title}, being sat</span>
          <b className="only-wide-inline candidate">{sitting.name}</b>
          <Link className="only-narrow-inline" to={to.path}>
            {to.label}
          </Link>
        </>
      }
    />
  );
}

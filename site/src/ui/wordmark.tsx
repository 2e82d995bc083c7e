import { Link } from 'react-router-dom';
import { FerruleShape } from './symbols/ferrule.tsx';

export function Wordmark() {
  return (
    <Link className="brand" to="/">
      <svg viewBox="0 0 44 20" height="18" aria-hidden="true">
        <FerruleShape />
      </svg>
      Ferrule
    </Link>
  );
}

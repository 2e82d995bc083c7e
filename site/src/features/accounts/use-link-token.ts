import { useLocation } from 'react-router-dom';

/** The one-use token of a mailed link. It stands after the #, which no server ever sees. */
export function useLinkToken(): string {
  return decodeURIComponent(useLocation().hash.slice(1));
}

import { RuledLines } from '../ui/states.tsx';

/** Stands while the first page is fetched. */
export function Opening() {
  return <RuledLines what="the page" />;
}

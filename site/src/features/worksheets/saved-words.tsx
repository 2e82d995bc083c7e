import { sayTimeOfDay } from '../../ui/dates.ts';
import { type Kept } from './answer-keeper.ts';

/** "Saved 12:41:07", or what is in the way. */
export function SavedWords({ kept: { state, savedAt } }: { kept: Kept }) {
  if (state === 'waiting') {
    return <>Not saved yet: the server does not answer. Stay on this page, it tries again.</>;
  }
  if (state === 'refused') return <>The last change was not taken.</>;
  if (state === 'saving') return <>Saving.</>;
  if (!savedAt) return <>Nothing to save yet.</>;
  return <>Saved {sayTimeOfDay(savedAt)}. You can leave and come back.</>;
}

import { NOTE_SUBJECTS, type ContentNote, type NoteSubject } from './problem-list.ts';

/** How many notes there are of each sort, on one line; empty when there is none. */
export function summariseNotes(notes: readonly ContentNote[]): string {
  const counted = (Object.keys(NOTE_SUBJECTS) as NoteSubject[]).flatMap((subject) => {
    const count = notes.filter(({ about }) => about === subject).length;
    return count === 0 ? [] : [`${NOTE_SUBJECTS[subject]}: ${count}`];
  });
  return counted.length === 0 ? '' : ` Noted: ${counted.join('; ')}.`;
}

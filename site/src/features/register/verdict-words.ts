import { type RegisterAnswer } from '../../api/views.ts';
import { sayDateInFull } from '../../ui/dates.ts';

interface VerdictWords {
  word: string;
  /** "until 3 November 2029", "on 22 May 2026" */
  until: string | null;
  todo: string;
}

/** One word, the date that goes with it, and what to do. */
export function sayVerdict({ answer, certificate }: RegisterAnswer): VerdictWords {
  if (!certificate || answer === 'not-on-register') {
    return {
      word: 'Not on the register',
      until: null,
      todo: 'No certificate goes with that number and name. Check both against the paper, letter by letter, and try again. If they agree with the paper, do not accept it and tell the school.',
    };
  }
  switch (answer) {
    case 'valid':
      return {
        word: 'Valid',
        until: `until ${sayDateInFull(certificate.expiresOn)}`,
        todo: 'Compare the name, the number and the strand mark with the paper.',
      };
    case 'expired':
      return {
        word: 'Expired',
        until: `on ${sayDateInFull(certificate.expiresOn)}`,
        todo: 'It was valid when it was issued. Ask the holder for the renewal.',
      };
    case 'withdrawn':
      return {
        word: 'Withdrawn',
        until: certificate.withdrawnOn ? `on ${sayDateInFull(certificate.withdrawnOn)}` : null,
        todo: 'The school has cancelled this certificate. Do not accept it. The reason is not published; employers may ask the school.',
      };
    case 'superseded':
      return {
        word: 'Replaced',
        until: 'by a later certificate',
        todo: 'The school issued it again with another number, for instance to correct a name. Ask the holder for the new one and check that.',
      };
  }
}

/** Longer words are set smaller, so that none of them breaks. */
export function sizeOfWord(word: string): string {
  if (word.length > 12) return 'long';
  return word.length > 6 ? 'wide-word' : '';
}

import type { LetterTemplate, TemplateName } from '../letter.ts';
import { accountLetters } from './account-letters.ts';
import { certificateLetters } from './certificate-letters.ts';
import { resultLetters } from './result-letters.ts';

export const templates: Readonly<Record<TemplateName, LetterTemplate>> = {
  ...accountLetters,
  ...certificateLetters,
  ...resultLetters,
};

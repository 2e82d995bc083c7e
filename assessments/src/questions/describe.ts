import { openQuestion } from './compiled.ts';
import { type CompiledQuestion, type PartView, type QuestionView } from './types.ts';

/** What a list says of a question before anything is drawn. */
export interface QuestionTraits {
  profile: QuestionView['profile'];
  /** Each way it asks, once, in the order of its parts. */
  kinds: PartView['kind'][];
  readsCurve: boolean;
}

/**
 * Says under which practice a question is asked and how.
 *
 * @throws {Error} when the question was compiled by another format version.
 */
export function describeQuestion(stored: CompiledQuestion): QuestionTraits {
  const { profile, parts, curve } = openQuestion(stored);
  const kinds = parts.map(({ kind }) => (kind === 'size' ? 'choice' : kind));
  return { profile, kinds: [...new Set(kinds)], readsCurve: curve !== null };
}

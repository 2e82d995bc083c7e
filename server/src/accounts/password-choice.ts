import { InvalidRequest } from '../problems/common.errors.ts';
import { judgePassword, type KnownOfPerson } from './passwords/judge-password.ts';

/**
 * Refuses a passphrase that is too short or among those tried first.
 *
 * @param pointer - the field it was typed into.
 * @throws {InvalidRequest} with the reason.
 */
export function requireGoodPassword(
  password: string,
  person: KnownOfPerson,
  pointer = '#/password',
): void {
  const { lengthShort, reason } = judgePassword(password, person);
  const length = lengthShort === 1 ? 'one character' : `${lengthShort} characters`;
  if (lengthShort > 0) {
    throw new InvalidRequest([{ pointer, detail: `Too short by ${length}: use 15 or more.` }]);
  }
  if (reason !== null) {
    throw new InvalidRequest([{ pointer, detail: `Choose another passphrase. ${reason}` }]);
  }
}

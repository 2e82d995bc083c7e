import { checkHolderName } from '@ferrule/certificates';
import { InvalidRequest } from '../problems/common.errors.ts';
import { nameOnCertificate } from './certificate.ts';
import { certificateFonts } from './certificate-fonts.ts';

/**
 * Asked when a name is confirmed: one that cannot be printed, or found again by its letters, must
 * not come to light only after the paper was passed.
 *
 * @throws {InvalidRequest} naming the field and the remedy.
 */
export async function requirePrintableName(givenName: string, familyName: string): Promise<void> {
  const { holderName, familyFold } = nameOnCertificate(givenName, familyName);
  const fonts = await certificateFonts();
  const checked = await checkHolderName(holderName, fonts);
  if (!checked.ok) {
    const isGivenName = !(await checkHolderName(givenName, fonts)).ok;
    const pointer = isGivenName || familyName === '' ? '#/givenName' : '#/familyName';
    throw new InvalidRequest([{ pointer, detail: checked.reason }]);
  }
  if (familyFold === '') {
    const detail = 'A name needs at least one letter: certificates are found by it.';
    throw new InvalidRequest([{ pointer: '#/givenName', detail }]);
  }
}

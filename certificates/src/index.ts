export { createAuthority, keyIdOf } from './authority.ts';
export {
  type Authority,
  type AuthorityOptions,
  type CertificateFonts,
  type CertificateStatement,
  type SigningKey,
} from './certificate.ts';
export {
  CertificateError,
  CharacterNotInFonts,
  KeyUnsuitable,
  NoPlaceToSign,
  StatementInvalid,
  StatementTooLong,
} from './errors.ts';
export { foldName } from './fold-name.ts';
export { newCertificateNumber, readCertificateNumber } from './number.ts';
export { fontFiles } from './pdf/fonts.ts';
export { checkHolderName } from './pdf/holder-name.ts';
export { renderCertificate } from './pdf/render.ts';
export { signPdf } from './sign.ts';
export { strandPattern } from './strand-pattern.ts';

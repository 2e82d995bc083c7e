import {
  type Authority,
  type AuthorityOptions,
  type CertificateFonts,
  type CertificateStatement,
  type SigningKey,
} from './certificate.ts';

export {
  type Authority,
  type AuthorityOptions,
  type CertificateFonts,
  type CertificateStatement,
  type SigningKey,
};

function unfinished(name: string): never {
  throw new Error(`${name} is not finished`);
}

export const fontFiles: Readonly<Record<keyof CertificateFonts, string>> = {
  text: '@expo-google-fonts/merriweather/400Regular/Merriweather_400Regular.ttf',
  textBold: '@expo-google-fonts/merriweather/600SemiBold/Merriweather_600SemiBold.ttf',
  textItalic:
    '@expo-google-fonts/merriweather/400Regular_Italic/Merriweather_400Regular_Italic.ttf',
  data: '@expo-google-fonts/source-sans-3/400Regular/SourceSans3_400Regular.ttf',
  dataBold: '@expo-google-fonts/source-sans-3/600SemiBold/SourceSans3_600SemiBold.ttf',
  number:
    '@fontsource/atkinson-hyperlegible-mono/files/atkinson-hyperlegible-mono-latin-600-normal.woff',
};

export async function renderCertificate(
  _statement: CertificateStatement,
  _fonts: CertificateFonts,
): Promise<Uint8Array> {
  return unfinished('renderCertificate');
}

export async function signPdf(
  _pdf: Uint8Array,
  _key: SigningKey,
  _signedAt: Date,
): Promise<Uint8Array> {
  return unfinished('signPdf');
}

export async function createAuthority(_options: AuthorityOptions): Promise<Authority> {
  return unfinished('createAuthority');
}

export function newCertificateNumber(_randomBytes: Uint8Array): string {
  return unfinished('newCertificateNumber');
}

export function readCertificateNumber(
  _typed: string,
): { ok: true; number: string } | { ok: false; reason: string } {
  return unfinished('readCertificateNumber');
}

export function foldName(_name: string): string {
  return unfinished('foldName');
}

export function strandPattern(_number: string): number[] {
  return unfinished('strandPattern');
}

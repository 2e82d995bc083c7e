import { fontFiles, type CertificateFonts } from '@ferrule/certificates';
import { readFile } from 'node:fs/promises';

let fonts: Promise<CertificateFonts> | undefined;

async function readFonts(): Promise<CertificateFonts> {
  const entries = Object.entries(fontFiles()).map(
    async ([face, file]) => [face, new Uint8Array(await readFile(file))] as const,
  );
  return Object.fromEntries(await Promise.all(entries)) as unknown as CertificateFonts;
}

/** The files a certificate is set in, read once a process. */
export function certificateFonts(): Promise<CertificateFonts> {
  fonts ??= readFonts();
  return fonts;
}

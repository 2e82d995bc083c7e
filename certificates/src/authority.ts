import 'reflect-metadata';
import { createHash, randomBytes } from 'node:crypto';
import {
  AuthorityKeyIdentifierExtension,
  BasicConstraintsExtension,
  KeyUsageFlags,
  KeyUsagesExtension,
  PemConverter,
  SubjectKeyIdentifierExtension,
  X509Certificate,
  X509CertificateGenerator,
} from '@peculiar/x509';
import { type Authority, type AuthorityOptions } from './certificate.ts';

const keyAlgorithm = { name: 'ECDSA', namedCurve: 'P-256', hash: 'SHA-256' } as const;

/**
 * Makes the school's own authority: a root and one leaf that signs certificates, both on P-256.
 *
 * The leaf never outlives its root. Keep `rootKeyPem` apart from the server and remove it there.
 */
export async function createAuthority(options: AuthorityOptions): Promise<Authority> {
  const notBefore = wholeSecond(options.now);
  const rootNotAfter = yearsAfter(notBefore, options.rootYears);
  const leafNotAfter = new Date(
    Math.min(yearsAfter(notBefore, options.leafYears).getTime(), rootNotAfter.getTime()),
  );
  const rootKeys = await newKeys();
  const leafKeys = await newKeys();
  const rootName = distinguishedName(options.organisation, `${options.organisation} root`);

  const root = await X509CertificateGenerator.createSelfSigned({
    serialNumber: newSerialNumber(),
    name: rootName,
    notBefore,
    notAfter: rootNotAfter,
    keys: rootKeys,
    signingAlgorithm: keyAlgorithm,
    extensions: [
      new BasicConstraintsExtension(true, 0, true),
      new KeyUsagesExtension(KeyUsageFlags.keyCertSign | KeyUsageFlags.cRLSign, true),
      await SubjectKeyIdentifierExtension.create(rootKeys.publicKey),
    ],
  });
  const leaf = await X509CertificateGenerator.create({
    serialNumber: newSerialNumber(),
    subject: distinguishedName(options.organisation, `${options.organisation} certificates`),
    issuer: rootName,
    notBefore,
    notAfter: leafNotAfter,
    publicKey: leafKeys.publicKey,
    signingKey: rootKeys.privateKey,
    signingAlgorithm: keyAlgorithm,
    extensions: [
      new BasicConstraintsExtension(false, undefined, true),
      new KeyUsagesExtension(KeyUsageFlags.digitalSignature | KeyUsageFlags.nonRepudiation, true),
      await SubjectKeyIdentifierExtension.create(leafKeys.publicKey),
      await AuthorityKeyIdentifierExtension.create(rootKeys.publicKey),
    ],
  });

  return {
    keyId: keyIdOf(leaf.toString('pem')),
    rootKeyId: keyIdOf(root.toString('pem')),
    rootCertificatePem: root.toString('pem'),
    rootKeyPem: await privateKeyPem(rootKeys),
    rootValidTo: rootNotAfter.toISOString(),
    certificatePem: leaf.toString('pem'),
    privateKeyPem: await privateKeyPem(leafKeys),
    validFrom: notBefore.toISOString(),
    validTo: leafNotAfter.toISOString(),
  };
}

/** A short name for a certificate's key: the first 16 hex digits of the SHA-256 of its public key. */
export function keyIdOf(certificatePem: string): string {
  const { rawData } = new X509Certificate(certificatePem).publicKey;
  return createHash('sha256').update(new Uint8Array(rawData)).digest('hex').slice(0, 16);
}

function newKeys(): Promise<CryptoKeyPair> {
  return crypto.subtle.generateKey(keyAlgorithm, true, ['sign', 'verify']);
}

async function privateKeyPem(keys: CryptoKeyPair): Promise<string> {
  return PemConverter.encode(
    await crypto.subtle.exportKey('pkcs8', keys.privateKey),
    PemConverter.PrivateKeyTag,
  );
}

function distinguishedName(organisation: string, commonName: string): Record<string, string[]>[] {
  return [{ O: [organisation] }, { CN: [commonName] }];
}

// 127 random bits, positive and never zero (RFC 5280, section 4.1.2.2).
function newSerialNumber(): string {
  const bytes = randomBytes(16);
  bytes[0] = ((bytes[0] ?? 0) & 0x7f) | 0x40;
  return bytes.toString('hex');
}

function wholeSecond(instant: Date): Date {
  return new Date(Math.floor(instant.getTime() / 1000) * 1000);
}

function yearsAfter(instant: Date, years: number): Date {
  const later = new Date(instant);
  later.setUTCFullYear(later.getUTCFullYear() + years);
  return later;
}

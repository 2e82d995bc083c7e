import 'reflect-metadata';
import { createHash, createPrivateKey, createPublicKey, type KeyObject, sign } from 'node:crypto';
import { X509Certificate } from '@peculiar/x509';
import { type SigningKey } from './certificate.ts';
import { der, derSetOf, objectIdentifier, positiveInteger, smallInteger, tags } from './der.ts';
import { KeyUnsuitable } from './errors.ts';

const oid = {
  data: objectIdentifier('1.2.840.113549.1.7.1'),
  signedData: objectIdentifier('1.2.840.113549.1.7.2'),
  contentType: objectIdentifier('1.2.840.113549.1.9.3'),
  messageDigest: objectIdentifier('1.2.840.113549.1.9.4'),
  signingCertificateV2: objectIdentifier('1.2.840.113549.1.9.16.2.47'),
  sha256: objectIdentifier('2.16.840.1.101.3.4.2.1'),
  ecdsaWithSha256: objectIdentifier('1.2.840.10045.4.3.2'),
};

/** The order of P-256's group (NIST SP 800-186, section 3.2.1.3). */
const groupOrder = 0xffffffff00000000ffffffffffffffffbce6faada7179e84f3b9cac2fc632551n;

interface Signer {
  privateKey: KeyObject;
  validFrom: Date;
  validTo: Date;
  /** The leaf first. */
  certificates: Buffer[];
  issuerAndSerialNumber: Buffer;
  signingCertificateAttribute: Buffer;
}

// Reading keys and certificates takes longer than signing with them.
const signers = new WeakMap<SigningKey, Signer>();

/**
 * A detached CMS signature (RFC 5652) in the CAdES baseline form of ETSI EN 319 122-1: content
 * type, message digest and signing-certificate-v2, and no signing time.
 *
 * @throws {KeyUnsuitable} when the key is not on P-256, not the certificate's or out of date.
 */
export function signDetached(contentDigest: Uint8Array, key: SigningKey, signedAt: Date): Buffer {
  const signer = signers.get(key) ?? readSigner(key);
  signers.set(key, signer);
  requireValidAt(signedAt, key.keyId, signer);

  const attributes = derSetOf([
    attribute(oid.contentType, oid.data),
    attribute(oid.messageDigest, der(tags.octetString, contentDigest)),
    signer.signingCertificateAttribute,
  ]);
  const implicitAttributes = Buffer.from(attributes);
  // The signature covers the SET OF; the message carries it as [0] IMPLICIT (RFC 5652, 5.4).
  implicitAttributes[0] = tags.context0;

  const digestAlgorithm = der(tags.sequence, oid.sha256);
  const signerInfo = der(
    tags.sequence,
    smallInteger(1),
    signer.issuerAndSerialNumber,
    digestAlgorithm,
    implicitAttributes,
    der(tags.sequence, oid.ecdsaWithSha256),
    der(tags.octetString, signCanonically(attributes, signer.privateKey)),
  );
  const certificates = derSetOf(signer.certificates);
  certificates[0] = tags.context0;
  const signedData = der(
    tags.sequence,
    smallInteger(1),
    derSetOf([digestAlgorithm]),
    der(tags.sequence, oid.data),
    certificates,
    derSetOf([signerInfo]),
  );
  return der(tags.sequence, oid.signedData, der(tags.context0, signedData));
}

function attribute(type: Buffer, value: Buffer): Buffer {
  return der(tags.sequence, type, derSetOf([value]));
}

// Of the two values of s that verify, the smaller: so nobody can turn one signature into another.
function signCanonically(content: Buffer, privateKey: KeyObject): Buffer {
  const signature = sign('sha256', content, { key: privateKey, dsaEncoding: 'ieee-p1363' });
  const s = BigInt(`0x${signature.subarray(32).toString('hex')}`);
  const smallerS = s > groupOrder / 2n ? groupOrder - s : s;
  return der(
    tags.sequence,
    positiveInteger(signature.subarray(0, 32)),
    positiveInteger(Buffer.from(smallerS.toString(16).padStart(64, '0'), 'hex')),
  );
}

function readSigner(key: SigningKey): Signer {
  const privateKey = createPrivateKey(key.privateKeyPem);
  const leaf = new X509Certificate(key.certificatePem);
  requireP256(key.keyId, privateKey);
  requireSameKey(key.keyId, privateKey, leaf);
  const certificates = [leaf, ...key.chainPem.map((pem) => new X509Certificate(pem))];
  const leafBytes = Buffer.from(leaf.rawData);
  const leafHash = createHash('sha256').update(leafBytes).digest();
  const essCertificate = der(tags.sequence, der(tags.octetString, leafHash));
  return {
    privateKey,
    validFrom: leaf.notBefore,
    validTo: leaf.notAfter,
    certificates: certificates.map(({ rawData }) => Buffer.from(rawData)),
    issuerAndSerialNumber: der(
      tags.sequence,
      Buffer.from(leaf.issuerName.toArrayBuffer()),
      positiveInteger(Buffer.from(leaf.serialNumber, 'hex')),
    ),
    signingCertificateAttribute: attribute(
      oid.signingCertificateV2,
      der(tags.sequence, der(tags.sequence, essCertificate)),
    ),
  };
}

function requireP256(keyId: string, privateKey: KeyObject): void {
  const curve = privateKey.asymmetricKeyDetails?.namedCurve;
  if (curve !== 'prime256v1') {
    throw new KeyUnsuitable(
      `Key ${keyId} is ${privateKey.asymmetricKeyType ?? 'unknown'}${curve ? ` on ${curve}` : ''}; ` +
        'certificates are signed with a key on P-256. Make one with createAuthority.',
    );
  }
}

function requireSameKey(keyId: string, privateKey: KeyObject, leaf: X509Certificate): void {
  const ours = createPublicKey(privateKey).export({ format: 'der', type: 'spki' });
  if (!ours.equals(Buffer.from(leaf.publicKey.rawData))) {
    throw new KeyUnsuitable(
      `The private key of ${keyId} does not belong to its certificate. Load the two together.`,
    );
  }
}

function requireValidAt(instant: Date, keyId: string, { validFrom, validTo }: Signer): void {
  if (instant < validFrom || instant > validTo) {
    throw new KeyUnsuitable(
      `Key ${keyId} is valid from ${validFrom.toISOString()} to ${validTo.toISOString()}, not at ` +
        `${instant.toISOString()}. Sign with a key that is in date.`,
    );
  }
}

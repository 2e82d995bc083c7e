import { type ReadCertificate, readCertificate, readPem } from './certificate-reader.ts';
import {
  areEqual,
  contentOf,
  derTags,
  type DerValue,
  identifierOf,
  membersOf,
  readDer,
} from './der-reader.ts';
import { isSignedBy, requireSmallerForm } from './ecdsa.ts';
import { malformed, Refusal } from './fault.ts';

/** Contents of the object identifiers, in hexadecimal. */
const identifiers = {
  data: '2a864886f70d010701',
  signedData: '2a864886f70d010702',
  contentType: '2a864886f70d010903',
  messageDigest: '2a864886f70d010904',
  signingCertificateV2: '2a864886f70d010910022f',
  sha256: '608648016503040201',
  ecdsaWithSha256: '2a8648ce3d040302',
};

interface Signature {
  /** The SET OF attributes, as it was signed. */
  signedAttributes: Uint8Array;
  messageDigest: Uint8Array;
  certificateHash: Uint8Array;
  value: Uint8Array;
  signer: ReadCertificate;
  others: ReadCertificate[];
}

export interface Archive {
  roots: ReadCertificate[];
  leaves: ReadCertificate[];
}

export function readArchive(issuers: { kind: 'root' | 'leaf'; pem: string }[]): Archive {
  const ofKind = (wanted: 'root' | 'leaf'): ReadCertificate[] =>
    issuers.filter(({ kind }) => kind === wanted).map(({ pem }) => readPem(pem));
  return { roots: ofKind('root'), leaves: ofKind('leaf') };
}

/**
 * Checks the signature over `content` against our own archive at the time of issue.
 *
 * @throws {Refusal} naming what is wrong.
 */
export async function checkSignature(
  octets: Uint8Array,
  content: Uint8Array<ArrayBuffer>,
  { archive, issuedAt }: { archive: Archive; issuedAt: Date },
): Promise<void> {
  const signature = readSignature(withoutPadding(octets));
  const { signer } = signature;
  if (!areEqual(signature.certificateHash, await sha256(signer.octets))) {
    throw malformed('it names another certificate than the one it carries.');
  }
  const root = await requireOurs(signature, archive);
  if (!areEqual(signature.messageDigest, await sha256(content))) {
    throw new Refusal(
      'changed-after-signing',
      'The file was changed after it was signed: its contents no longer match the signature.',
    );
  }
  requireSmallerForm(signature.value);
  if (!(await isSignedBy(signer.publicKeyInfo, signature.value, signature.signedAttributes))) {
    throw new Refusal(
      'changed-after-signing',
      'The signature itself was changed: it does not belong to this file and our key.',
    );
  }
  requireValidAt(issuedAt, [signer, root]);
}

function withoutPadding(octets: Uint8Array): Uint8Array {
  const message = readDer(octets).octets;
  if (octets.subarray(message.length).some((octet) => octet !== 0)) {
    throw new Refusal(
      'added-to',
      'Bytes are hidden after the signature, in the room that must stay empty.',
    );
  }
  return message;
}

function readSignature(message: Uint8Array): Signature {
  const [type, wrapped, ...afterContent] = membersOf(readDer(message), derTags.sequence);
  requireIdentifier(type, identifiers.signedData);
  const [signedData, ...afterSignedData] = membersOf(wrapped, derTags.context0);
  const [version, digests, encapsulated, certificates, signerInfos, ...afterSigners] = membersOf(
    signedData,
    derTags.sequence,
  );
  requireNothing(afterContent, afterSignedData, afterSigners);
  requireVersionOne(version);
  const [digest, ...moreDigests] = membersOf(digests, derTags.set);
  requireAlgorithm(digest, identifiers.sha256);
  const [contentType, ...embeddedContent] = membersOf(encapsulated, derTags.sequence);
  requireIdentifier(contentType, identifiers.data);
  const [signerInfo, ...moreSigners] = membersOf(signerInfos, derTags.set);
  requireNothing(moreDigests, embeddedContent, moreSigners);
  const carried = membersOf(certificates, derTags.context0).map(({ octets }) =>
    readCertificate(octets),
  );
  return readSignerInfo(signerInfo, carried);
}

function readSignerInfo(signerInfo: DerValue | undefined, carried: ReadCertificate[]): Signature {
  const [version, signerId, digest, attributes, algorithm, value, ...unsigned] = membersOf(
    signerInfo,
    derTags.sequence,
  );
  requireVersionOne(version);
  requireAlgorithm(digest, identifiers.sha256);
  requireAlgorithm(algorithm, identifiers.ecdsaWithSha256);
  requireNothing(unsigned);
  const named = contentOf(signerId, derTags.sequence);
  const signer = carried.find((one) => areEqual(one.issuerAndSerialNumber, named));
  if (!signer) throw malformed('it does not carry the certificate it names.');
  const signedAttributes = new Uint8Array(attributes?.octets ?? []);
  // Signed as a SET OF, carried as [0] IMPLICIT (RFC 5652, section 5.4).
  signedAttributes[0] = derTags.set;
  return {
    signedAttributes,
    ...readAttributes(attributes),
    value: contentOf(value, derTags.octetString),
    signer,
    others: carried.filter((one) => one !== signer),
  };
}

function readAttributes(
  attributes: DerValue | undefined,
): Pick<Signature, 'messageDigest' | 'certificateHash'> {
  const found = new Map<string, DerValue>();
  const all = membersOf(attributes, derTags.context0);
  for (const attribute of all) {
    const [type, values, ...rest] = membersOf(attribute, derTags.sequence);
    const [value, ...more] = membersOf(values, derTags.set);
    requireNothing(rest, more);
    if (value) found.set(identifierOf(type), value);
  }
  // Three different ones and no others, so no signing time either: the register keeps the time.
  if (all.length !== 3 || found.size !== 3) {
    throw malformed('it does not hold exactly our three attributes.');
  }
  requireIdentifier(found.get(identifiers.contentType), identifiers.data);
  const signingCertificate = found.get(identifiers.signingCertificateV2);
  const [certificateIds, ...policies] = membersOf(signingCertificate, derTags.sequence);
  const [certificateId, ...moreIds] = membersOf(certificateIds, derTags.sequence);
  const [certificateHash, ...moreOfId] = membersOf(certificateId, derTags.sequence);
  requireNothing(policies, moreIds, moreOfId);
  return {
    messageDigest: contentOf(found.get(identifiers.messageDigest), derTags.octetString),
    certificateHash: contentOf(certificateHash, derTags.octetString),
  };
}

async function requireOurs(
  { signer, others }: Signature,
  { roots, leaves }: Archive,
): Promise<ReadCertificate> {
  const root = await issuerAmong(roots, signer);
  if (!root) {
    throw new Refusal(
      'wrong-issuer',
      'The file was signed by someone else: its certificate does not come from our authority.',
    );
  }
  if (!isAmong(leaves, signer)) {
    throw new Refusal(
      'unknown-key',
      'The file was signed with a key our register does not know, though it names our authority.',
    );
  }
  if (!others.every((one) => isAmong(roots, one))) {
    throw malformed('it carries a certificate that is not ours.');
  }
  return root;
}

async function issuerAmong(
  roots: ReadCertificate[],
  leaf: ReadCertificate,
): Promise<ReadCertificate | undefined> {
  for (const root of roots) {
    // A signature of another kind or length is simply not our root's.
    const isIts = await isSignedBy(root.publicKeyInfo, leaf.signature, leaf.signedPart).catch(
      () => false,
    );
    if (isIts) return root;
  }
  return undefined;
}

function isAmong(known: ReadCertificate[], one: ReadCertificate): boolean {
  return known.some(({ octets }) => areEqual(octets, one.octets));
}

function requireValidAt(issuedAt: Date, certificates: ReadCertificate[]): void {
  const outside = certificates.find((one) => issuedAt < one.validFrom || issuedAt > one.validTo);
  if (outside) {
    const day = (date: Date): string => date.toISOString().slice(0, 10);
    throw new Refusal(
      'expired-key-at-issue',
      `The key was valid from ${day(outside.validFrom)} to ${day(outside.validTo)}, ` +
        `not when the certificate was issued (${day(issuedAt)}).`,
    );
  }
}

function requireNothing(...rests: DerValue[][]): void {
  if (rests.some((rest) => rest.length > 0)) throw malformed('it holds more than ours do.');
}

function requireVersionOne(value: DerValue | undefined): void {
  if (!areEqual(contentOf(value, derTags.integer), Uint8Array.of(1))) {
    throw malformed('it is of another version.');
  }
}

function requireAlgorithm(value: DerValue | undefined, wanted: string): void {
  const [identifier, ...parameters] = membersOf(value, derTags.sequence);
  requireIdentifier(identifier, wanted);
  requireNothing(parameters);
}

function requireIdentifier(value: DerValue | undefined, wanted: string): void {
  if (identifierOf(value) !== wanted) {
    throw malformed('it uses another kind of content or another method.');
  }
}

export async function sha256(octets: Uint8Array): Promise<Uint8Array> {
  return new Uint8Array(await crypto.subtle.digest('SHA-256', new Uint8Array(octets)));
}

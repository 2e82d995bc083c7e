import { contentOf, derTags, type DerValue, membersOf, readDer } from './der-reader.ts';
import { malformed } from './fault.ts';

/** What the check needs of an X.509 certificate (RFC 5280, section 4.1). */
export interface ReadCertificate {
  octets: Uint8Array;
  signedPart: Uint8Array;
  signature: Uint8Array;
  /** DER of issuer name and serial number, as a signature names its certificate. */
  issuerAndSerialNumber: Uint8Array;
  publicKeyInfo: Uint8Array;
  validFrom: Date;
  validTo: Date;
}

export function readCertificate(octets: Uint8Array): ReadCertificate {
  const certificate = readDer(octets);
  const [signedPart, , signature] = membersOf(certificate, derTags.sequence);
  const [version, serialNumber, , issuer, validity, , publicKeyInfo] = membersOf(
    signedPart,
    derTags.sequence,
  );
  const signatureBits = contentOf(signature, derTags.bitString);
  contentOf(version, derTags.context0);
  if (!signedPart || !serialNumber || !issuer || !publicKeyInfo) {
    throw malformed('its certificate lacks a part.');
  }
  const [validFrom, validTo] = membersOf(validity, derTags.sequence);
  return {
    octets: certificate.octets,
    signedPart: signedPart.octets,
    // The first octet counts unused bits, of which there are none.
    signature: signatureBits.subarray(1),
    issuerAndSerialNumber: new Uint8Array([...issuer.octets, ...serialNumber.octets]),
    publicKeyInfo: publicKeyInfo.octets,
    validFrom: readTime(validFrom),
    validTo: readTime(validTo),
  };
}

/** @throws {Error} when the text is not a PEM certificate: the archive is at fault, not the file. */
export function readPem(pem: string): ReadCertificate {
  const body = /-----BEGIN CERTIFICATE-----([\sA-Za-z0-9+/=]+)-----END CERTIFICATE-----/.exec(pem);
  if (body?.[1] === undefined) {
    throw new Error('An issuer certificate is not PEM; load it from the register again.');
  }
  const decoded = atob(body[1].replace(/\s/g, ''));
  return readCertificate(Uint8Array.from(decoded, (character) => character.charCodeAt(0)));
}

function readTime(value: DerValue | undefined): Date {
  const isShort = value?.tag === derTags.utcTime;
  const content = contentOf(value, isShort ? derTags.utcTime : derTags.generalizedTime);
  const text = new TextDecoder('latin1').decode(content.subarray(0, 20));
  // Two-digit years run from 1950 to 2049 (RFC 5280, section 4.1.2.5.1).
  const century = text < '50' ? '20' : '19';
  const parts = /^(\d{4})(\d\d)(\d\d)(\d\d)(\d\d)(\d\d)Z$/.exec(isShort ? century + text : text);
  if (!parts) throw malformed('a date in its certificate cannot be read.');
  const [, year, month, day, hour, minute, second] = parts;
  return new Date(`${year}-${month}-${day}T${hour}:${minute}:${second}Z`);
}

import { malformed } from './fault.ts';

/** One value of DER: its tag, its contents and all its octets. */
export interface DerValue {
  tag: number;
  content: Uint8Array;
  octets: Uint8Array;
}

export const derTags = {
  bitString: 0x03,
  integer: 0x02,
  octetString: 0x04,
  objectIdentifier: 0x06,
  utcTime: 0x17,
  generalizedTime: 0x18,
  sequence: 0x30,
  set: 0x31,
  context0: 0xa0,
} as const;

/** The value at the start of `octets`; what follows it is the caller's affair. */
export function readDer(octets: Uint8Array): DerValue {
  const tag = octets[0];
  if (tag === undefined || (tag & 0x1f) === 0x1f) throw malformed('a value has no readable tag.');
  const { length, headerLength } = readLength(octets);
  const end = headerLength + length;
  if (end > octets.length) throw malformed('a value reaches beyond the end of its container.');
  return { tag, content: octets.subarray(headerLength, end), octets: octets.subarray(0, end) };
}

// Definite and in the shortest form (X.690, 10.1): there is one way to write a length.
function readLength(octets: Uint8Array): { length: number; headerLength: number } {
  const first = octets[1] ?? 0x80;
  if (first < 0x80) return { length: first, headerLength: 2 };
  const count = first & 0x7f;
  if (count === 0 || count > 3) throw malformed('a length is indefinite or out of range.');
  const length = octets.subarray(2, 2 + count).reduce((sum, octet) => sum * 256 + octet, 0);
  const isShortest = length >= 0x80 && (octets[2] ?? 0) !== 0;
  if (!isShortest) throw malformed('a length is not in its shortest form.');
  return { length, headerLength: 2 + count };
}

/** The members of a value, which must be of that tag and filled by them exactly. */
export function membersOf(value: DerValue | undefined, tag: number): DerValue[] {
  const members: DerValue[] = [];
  let rest = contentOf(value, tag);
  while (rest.length > 0) {
    const member = readDer(rest);
    members.push(member);
    rest = rest.subarray(member.octets.length);
  }
  return members;
}

export function contentOf(value: DerValue | undefined, tag: number): Uint8Array {
  if (value?.tag !== tag) throw malformed('a part is missing or of another kind.');
  return value.content;
}

/** The contents of an OBJECT IDENTIFIER in hexadecimal, which is how identifiers are compared. */
export function identifierOf(value: DerValue | undefined): string {
  return toHex(contentOf(value, derTags.objectIdentifier));
}

export function toHex(octets: Uint8Array): string {
  return Array.from(octets, (octet) => octet.toString(16).padStart(2, '0')).join('');
}

export function areEqual(one: Uint8Array, other: Uint8Array): boolean {
  return one.length === other.length && one.every((octet, index) => octet === other[index]);
}

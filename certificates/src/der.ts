/** DER, as much as a signature needs (ITU-T X.690): definite lengths, shortest form. */
export const tags = {
  integer: 0x02,
  octetString: 0x04,
  objectIdentifier: 0x06,
  sequence: 0x30,
  set: 0x31,
  context0: 0xa0,
} as const;

export function der(tag: number, ...contents: Uint8Array[]): Buffer {
  const body = Buffer.concat(contents);
  return Buffer.concat([Buffer.from([tag, ...lengthOctets(body.length)]), body]);
}

function lengthOctets(length: number): number[] {
  if (length < 0x80) return [length];
  const octets: number[] = [];
  for (let rest = length; rest > 0; rest = Math.floor(rest / 256)) octets.unshift(rest % 256);
  return [0x80 | octets.length, ...octets];
}

/** A SET OF in DER: its members sorted as octet strings. */
export function derSetOf(members: Buffer[]): Buffer {
  return der(tags.set, ...members.toSorted((one, other) => Buffer.compare(one, other)));
}

export function objectIdentifier(dotted: string): Buffer {
  const [first = 0, second = 0, ...rest] = dotted.split('.').map(Number);
  return der(tags.objectIdentifier, Buffer.from([first * 40 + second, ...rest.flatMap(base128)]));
}

function base128(value: number): number[] {
  const octets = [value % 128];
  for (let rest = Math.floor(value / 128); rest > 0; rest = Math.floor(rest / 128)) {
    octets.unshift(0x80 | (rest % 128));
  }
  return octets;
}

export function smallInteger(value: number): Buffer {
  return der(tags.integer, Buffer.from([value]));
}

/** A positive INTEGER from its big-endian octets. */
export function positiveInteger(octets: Uint8Array): Buffer {
  const start = octets.findIndex((octet) => octet !== 0);
  const significant = start < 0 ? Buffer.from([0]) : Buffer.from(octets.subarray(start));
  const needsSignOctet = ((significant[0] ?? 0) & 0x80) !== 0;
  return der(tags.integer, ...(needsSignOctet ? [Buffer.from([0])] : []), significant);
}

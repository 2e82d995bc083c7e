import { contentOf, derTags, type DerValue, membersOf, readDer } from './der-reader.ts';
import { malformed } from './fault.ts';

const parameters = { name: 'ECDSA', namedCurve: 'P-256', hash: 'SHA-256' } as const;
const coordinateLength = 32;

/** Half the order of P-256's group (NIST SP 800-186, section 3.2.1.3). */
const halfGroupOrder = 0x7fffffff800000007fffffffffffffffde737d56d38bcf4279dce5617e3192a8n;

/** ECDSA-Sig-Value as the two 32-octet numbers Web Crypto wants. */
function rawSignature(signature: Uint8Array): { octets: Uint8Array<ArrayBuffer>; s: bigint } {
  const value = readDer(signature);
  const [r, s, ...more] = membersOf(value, derTags.sequence);
  if (value.octets.length !== signature.length || more.length > 0) {
    throw malformed('its value is followed by something else.');
  }
  const octets = new Uint8Array(2 * coordinateLength);
  octets.set(coordinate(r), 0);
  octets.set(coordinate(s), coordinateLength);
  const hex = Array.from(octets.subarray(coordinateLength), (octet) =>
    octet.toString(16).padStart(2, '0'),
  ).join('');
  return { octets, s: BigInt(`0x${hex}`) };
}

function coordinate(value: DerValue | undefined): Uint8Array {
  const content = contentOf(value, derTags.integer);
  const [first = 0x80, second = 0] = content;
  const isShortestPositive = first < 0x80 && !(first === 0 && second < 0x80 && content.length > 1);
  const significant = first === 0 ? content.subarray(1) : content;
  if (!isShortestPositive || significant.length > coordinateLength) {
    throw malformed('one of its numbers is not in its only form.');
  }
  const padded = new Uint8Array(coordinateLength);
  padded.set(significant, coordinateLength - significant.length);
  return padded;
}

/** The signature of a certificate, by whoever made it. */
export async function isSignedBy(
  publicKeyInfo: Uint8Array,
  signature: Uint8Array,
  content: Uint8Array,
): Promise<boolean> {
  const key = await crypto.subtle.importKey(
    'spki',
    new Uint8Array(publicKeyInfo),
    parameters,
    false,
    ['verify'],
  );
  const { octets } = rawSignature(signature);
  return crypto.subtle.verify(parameters, key, octets, new Uint8Array(content));
}

/** Ours are always the smaller of the two values that verify: the other one is an alteration. */
export function requireSmallerForm(signature: Uint8Array): void {
  if (rawSignature(signature).s > halfGroupOrder) {
    throw malformed('its value was turned into another that would also verify.');
  }
}

import { generateKeyPairSync, sign } from 'node:crypto';
import { describe, expect, it } from 'vitest';
import { der, positiveInteger, tags } from '../der.ts';
import { isSignedBy, requireSmallerForm } from './ecdsa.ts';

const order = 0xffffffff00000000ffffffffffffffffbce6faada7179e84f3b9cac2fc632551n;
const { privateKey, publicKey } = generateKeyPairSync('ec', { namedCurve: 'P-256' });
const publicKeyInfo = publicKey.export({ type: 'spki', format: 'der' });
const content = Buffer.from('certificate');

/** A signature with the smaller of the two values of s that verify, and with the larger. */
function twins(): { smaller: Buffer; larger: Buffer } {
  const raw = sign('sha256', content, { key: privateKey, dsaEncoding: 'ieee-p1363' });
  const r = positiveInteger(raw.subarray(0, 32));
  const s = BigInt(`0x${raw.subarray(32).toString('hex')}`);
  const [smaller, larger] = s < order - s ? [s, order - s] : [order - s, s];
  const withS = (value: bigint): Buffer =>
    der(
      tags.sequence,
      r,
      positiveInteger(Buffer.from(value.toString(16).padStart(64, '0'), 'hex')),
    );
  return { smaller: withS(smaller), larger: withS(larger) };
}

describe('a signature on P-256', () => {
  it('verifies in both its forms, of which only the smaller is ours', async () => {
    for (let round = 0; round < 20; round += 1) {
      const { smaller, larger } = twins();
      expect(await isSignedBy(publicKeyInfo, smaller, content)).toBe(true);
      expect(await isSignedBy(publicKeyInfo, larger, content)).toBe(true);
      expect(() => requireSmallerForm(smaller)).not.toThrow();
      expect(() => requireSmallerForm(larger)).toThrow('turned into another');
    }
  });

  it('does not verify over something else', async () => {
    const { smaller } = twins();
    expect(await isSignedBy(publicKeyInfo, smaller, Buffer.from('certificates'))).toBe(false);
  });

  it('is read in one form only', () => {
    const one = positiveInteger(Buffer.from([1]));
    const wide = der(tags.integer, Buffer.alloc(34, 1));
    for (const signature of [
      Buffer.concat([der(tags.sequence, one, one), Buffer.from([0])]),
      der(tags.sequence, one, one, one),
      der(tags.sequence, one),
      der(tags.sequence, one, Buffer.from('02020001', 'hex')),
      der(tags.sequence, one, Buffer.from('020181', 'hex')),
      der(tags.sequence, one, wide),
      Buffer.from('3080020101020101', 'hex'),
      Buffer.from('308106020101020101', 'hex'),
    ]) {
      expect(() => requireSmallerForm(signature)).toThrow('not made the way ours are');
    }
  });
});

import { createCipheriv, createDecipheriv, randomBytes } from 'node:crypto';

const IV_BYTES = 12;
const TAG_BYTES = 16;
const KEY_BYTES = 32;

/** A stored secret that does not open: another key, another account, or changed bytes. */
export class SealBroken extends Error {
  constructor() {
    super('A sealed secret does not open with this key.');
    this.name = 'SealBroken';
  }
}

const keyFrom = (hex: string) => Buffer.from(hex, 'hex').subarray(0, KEY_BYTES);

/**
 * Seals a text with AES-256-GCM.
 *
 * @param owner - whose it is: moved to another row it does not open.
 */
export function seal(text: string, owner: string, keyHex: string): Buffer {
  const iv = randomBytes(IV_BYTES);
  const cipher = createCipheriv('aes-256-gcm', keyFrom(keyHex), iv);
  cipher.setAAD(Buffer.from(owner));
  const sealed = Buffer.concat([cipher.update(text, 'utf8'), cipher.final()]);
  return Buffer.concat([iv, cipher.getAuthTag(), sealed]);
}

/** @throws {SealBroken} */
export function unseal(bytes: Buffer, owner: string, keyHex: string): string {
  try {
    const iv = bytes.subarray(0, IV_BYTES);
    const decipher = createDecipheriv('aes-256-gcm', keyFrom(keyHex), iv, {
      authTagLength: TAG_BYTES,
    });
    decipher.setAAD(Buffer.from(owner));
    decipher.setAuthTag(bytes.subarray(IV_BYTES, IV_BYTES + TAG_BYTES));
    const text = decipher.update(bytes.subarray(IV_BYTES + TAG_BYTES));
    return Buffer.concat([text, decipher.final()]).toString('utf8');
  } catch {
    throw new SealBroken();
  }
}

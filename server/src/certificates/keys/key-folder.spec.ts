import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import {
  chmodSync,
  cpSync,
  mkdtempSync,
  readdirSync,
  rmSync,
  statSync,
  writeFileSync,
} from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { makeKey, readKey, type HeldKey } from './key-folder.ts';

const options = { organisation: 'Harrow Quay', validFrom: new Date('2023-09-01T00:00:00Z') };
const base = mkdtempSync(join(tmpdir(), 'ferrule-key-folder-'));
const good = join(base, 'good');
let key: HeldKey;

beforeAll(async () => {
  key = await makeKey(good, options);
});
afterAll(() => rmSync(base, { recursive: true }));

/** A copy of the good folder with something wrong in it. */
function spoilt(name: string, spoil: (path: (file: string) => string) => void): string {
  const folder = join(base, name);
  cpSync(good, folder, { recursive: true });
  spoil((file) => join(folder, file));
  return folder;
}

describe('a folder of signing keys', () => {
  it('holds the private key for its owner alone, and no key of the root', () => {
    const files = readdirSync(good);
    const privateKeys = files.filter((file) => file.endsWith('.key.pem'));
    expect(privateKeys).toEqual([`${key.keyId}.key.pem`]);
    for (const file of privateKeys) expect(statSync(join(good, file)).mode & 0o777).toBe(0o600);
    expect(statSync(good).mode & 0o777).toBe(0o700);
  });

  it('gives the key, its root and the time it may sign in', async () => {
    expect(await readKey(good)).toEqual(key);
    expect(key.validFrom).toEqual(options.validFrom);
    expect(key.validTo).toEqual(new Date('2031-09-01T00:00:00Z'));
    expect(key.rootValidTo).toEqual(new Date('2043-09-01T00:00:00Z'));
  });

  it('takes a later key into use and keeps the files of the first', async () => {
    const folder = spoilt('rotated', () => undefined);
    const second = await makeKey(folder, {
      ...options,
      validFrom: new Date('2026-12-01T00:00:00Z'),
    });
    expect((await readKey(folder)).keyId).toBe(second.keyId);
    expect(readdirSync(folder)).toContain(`${key.keyId}.crt.pem`);
  });

  it('is told to be empty only when there has never been a key in it', async () => {
    await expect(readKey(join(base, 'none'))).rejects.toMatchObject({ isEmpty: true });
    const damaged = spoilt('cut-short', (path) => writeFileSync(path('current.json'), '{"keyId'));
    await expect(readKey(damaged)).rejects.toMatchObject({ isEmpty: false });
  });

  it.each([
    [
      'no private key',
      'ENOENT',
      (path: (file: string) => string) => rmSync(path(`${key.keyId}.key.pem`)),
    ],
    [
      'a private key that others may read',
      'chmod 600',
      (path: (file: string) => string) => chmodSync(path(`${key.keyId}.key.pem`), 0o640),
    ],
    [
      'a certificate of another key',
      'is of another key',
      (path: (file: string) => string) =>
        cpSync(path(`${key.rootKeyId}.crt.pem`), path(`${key.keyId}.crt.pem`)),
    ],
  ])('is refused with %s, saying so', async (what, why, spoil) => {
    const folder = spoilt(what, spoil);
    await expect(readKey(folder)).rejects.toThrow(why);
    await expect(readKey(folder)).rejects.toThrow(
      `KEYS_FOLDER ${folder} holds no usable signing key`,
    );
  });

  it("is refused with somebody else's private key", async () => {
    const other = await makeKey(join(base, 'other'), options);
    const folder = spoilt('mixed', (path) =>
      cpSync(join(base, 'other', `${other.keyId}.key.pem`), path(`${key.keyId}.key.pem`)),
    );
    await expect(readKey(folder)).rejects.toThrow("is another's");
  });

  it('is refused with a root that did not sign the key', async () => {
    const other = await makeKey(join(base, 'another'), options);
    const folder = spoilt('unrooted', (path) => {
      const root = `${other.rootKeyId}.crt.pem`;
      cpSync(join(base, 'another', root), path(root));
      writeFileSync(
        path('current.json'),
        JSON.stringify({ keyId: key.keyId, rootKeyId: other.rootKeyId }),
      );
    });
    await expect(readKey(folder)).rejects.toThrow('did not sign');
  });
});

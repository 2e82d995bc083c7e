import { createAuthority, type SigningKey } from '@ferrule/certificates';
import { chmod, mkdir, readFile, rename, writeFile } from 'node:fs/promises';
import { join } from 'node:path';

/** The key in use and the public certificates the register must keep. */
export interface HeldKey extends SigningKey {
  readonly rootKeyId: string;
  readonly validFrom: string;
  readonly validTo: string;
  readonly rootValidTo: string;
}

interface CurrentKey {
  readonly keyId: string;
  readonly rootKeyId: string;
  readonly validFrom: string;
  readonly validTo: string;
  readonly rootValidTo: string;
}

const privateKeyFile = (keyId: string) => `${keyId}.key.pem`;
const certificateFile = (keyId: string) => `${keyId}.crt.pem`;
const CURRENT = 'current.json';

/** The folder of the signing keys holds none that can be used. */
export class NoSigningKey extends Error {
  constructor(folder: string, why: string) {
    super(
      `KEYS_FOLDER ${folder} holds no usable signing key (${why}). Put back current.json with the ` +
        'key and the certificates it names.',
    );
    this.name = 'NoSigningKey';
  }
}

async function writePrivately(path: string, text: string): Promise<void> {
  await writeFile(path, text, { mode: 0o600 });
  await chmod(path, 0o600);
}

/** @throws {NoSigningKey} */
export async function readKey(folder: string): Promise<HeldKey> {
  try {
    const current = JSON.parse(await readFile(join(folder, CURRENT), 'utf8')) as CurrentKey;
    const { keyId, rootKeyId } = current;
    const [privateKeyPem, certificatePem, rootPem] = await Promise.all([
      readFile(join(folder, privateKeyFile(keyId)), 'utf8'),
      readFile(join(folder, certificateFile(keyId)), 'utf8'),
      readFile(join(folder, certificateFile(rootKeyId)), 'utf8'),
    ]);
    return { ...current, privateKeyPem, certificatePem, chainPem: [rootPem] };
  } catch (error) {
    throw new NoSigningKey(folder, error instanceof Error ? error.message : String(error));
  }
}

export interface NewKey {
  readonly organisation: string;
  readonly validFrom: Date;
  /** Where the root's private key goes, to be taken away; without a place it is not kept at all. */
  readonly rootKeyFile?: string;
}

const LEAF_YEARS = 8;
const ROOT_YEARS = 20;

/** Makes an authority of the school's own and puts its leaf into use; `current.json` comes last. */
export async function makeKey(folder: string, options: NewKey): Promise<HeldKey> {
  const { organisation, validFrom: now, rootKeyFile } = options;
  const authority = await createAuthority({
    ...{ organisation, now },
    leafYears: LEAF_YEARS,
    rootYears: ROOT_YEARS,
  });
  const { keyId, rootKeyId, validFrom, validTo, rootValidTo } = authority;
  await mkdir(folder, { recursive: true, mode: 0o700 });
  await writePrivately(join(folder, privateKeyFile(keyId)), authority.privateKeyPem);
  await writeFile(join(folder, certificateFile(keyId)), authority.certificatePem);
  await writeFile(join(folder, certificateFile(rootKeyId)), authority.rootCertificatePem);
  if (rootKeyFile) await writePrivately(rootKeyFile, authority.rootKeyPem);
  const current: CurrentKey = { keyId, rootKeyId, validFrom, validTo, rootValidTo };
  await writePrivately(join(folder, `${CURRENT}.new`), JSON.stringify(current, null, 2));
  await rename(join(folder, `${CURRENT}.new`), join(folder, CURRENT));
  return readKey(folder);
}

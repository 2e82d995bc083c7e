import { createAuthority, keyIdOf, type SigningKey } from '@ferrule/certificates';
import { createPrivateKey, X509Certificate } from 'node:crypto';
import { mkdir, readFile, rename, stat, writeFile } from 'node:fs/promises';
import { join } from 'node:path';

/** The key in use and its root, as far as a server needs them. */
export interface HeldKey extends SigningKey {
  readonly rootKeyId: string;
  /** When its certificate may sign. */
  readonly validFrom: Date;
  readonly validTo: Date;
  readonly rootValidFrom: Date;
  readonly rootValidTo: Date;
}

/** Names the key in use: its files are `KEYID.key.pem` and `KEYID.crt.pem`, its root's `ROOTKEYID.crt.pem`. */
interface CurrentKey {
  readonly keyId: string;
  readonly rootKeyId: string;
}

const CURRENT = 'current.json';
const privateKeyFile = (keyId: string) => `${keyId}.key.pem`;
const certificateFile = (keyId: string) => `${keyId}.crt.pem`;

const putBack = `Put back ${CURRENT} with the key and the certificates it names.`;

/** The folder of the signing keys holds none that can be used. */
export class NoSigningKey extends Error {
  constructor(
    folder: string,
    why: string,
    /** There has never been a key here. */
    readonly isEmpty = false,
  ) {
    super(`KEYS_FOLDER ${folder} holds no usable signing key: ${why}`);
    this.name = 'NoSigningKey';
  }
}

/**
 * Reads the key in use and makes sure that its parts belong together.
 *
 * @throws {NoSigningKey}
 */
export async function readKey(folder: string): Promise<HeldKey> {
  const current = await readCurrent(folder);
  try {
    return await readParts(folder, current);
  } catch (error) {
    if (error instanceof NoSigningKey) throw error;
    const why = error instanceof Error ? error.message : String(error);
    throw new NoSigningKey(folder, `${why.replace(/\.$/, '')}. ${putBack}`);
  }
}

async function readCurrent(folder: string): Promise<CurrentKey> {
  try {
    const current = JSON.parse(await readFile(join(folder, CURRENT), 'utf8')) as CurrentKey;
    const isNamed = (name: unknown) => typeof name === 'string' && /^[0-9a-f]{16}$/.test(name);
    if (isNamed(current.keyId) && isNamed(current.rootKeyId)) return current;
  } catch (error) {
    if ((error as NodeJS.ErrnoException).code === 'ENOENT') {
      throw new NoSigningKey(folder, `it has no ${CURRENT}. ${putBack}`, true);
    }
  }
  throw new NoSigningKey(folder, `its ${CURRENT} does not name a key and its root. ${putBack}`);
}

async function readParts(folder: string, { keyId, rootKeyId }: CurrentKey): Promise<HeldKey> {
  const keyPath = join(folder, privateKeyFile(keyId));
  await requirePrivate(folder, keyPath);
  const [privateKeyPem, certificatePem, rootPem] = await Promise.all([
    readFile(keyPath, 'utf8'),
    readFile(join(folder, certificateFile(keyId)), 'utf8'),
    readFile(join(folder, certificateFile(rootKeyId)), 'utf8'),
  ]);
  const leaf = new X509Certificate(certificatePem);
  const root = new X509Certificate(rootPem);
  insist(keyIdOf(certificatePem) === keyId, `the certificate of ${keyId} is of another key.`);
  insist(keyIdOf(rootPem) === rootKeyId, `the certificate of ${rootKeyId} is of another key.`);
  insist(
    leaf.checkPrivateKey(createPrivateKey(privateKeyPem)),
    `the private key of ${keyId} is another's.`,
  );
  insist(leaf.verify(root.publicKey), `${rootKeyId} did not sign the certificate of ${keyId}.`);
  return {
    ...{ keyId, rootKeyId, privateKeyPem, certificatePem, chainPem: [rootPem] },
    validFrom: new Date(leaf.validFrom),
    validTo: new Date(leaf.validTo),
    rootValidFrom: new Date(root.validFrom),
    rootValidTo: new Date(root.validTo),
  };
}

function insist(isSo: boolean, otherwise: string): void {
  if (!isSo) throw new Error(otherwise);
}

async function requirePrivate(folder: string, path: string): Promise<void> {
  const { mode } = await stat(path);
  if ((mode & 0o077) === 0) return;
  throw new NoSigningKey(folder, `others may read ${path}. Give it to its owner alone: chmod 600.`);
}

export interface NewKey {
  readonly organisation: string;
  readonly validFrom: Date;
}

const LEAF_YEARS = 8;
const ROOT_YEARS = 20;

/**
 * Makes an authority of the school's own and puts its leaf into use; `current.json` comes last.
 * The root's private key signs the leaf and is then forgotten: a later key comes with a root of
 * its own, and the register keeps every root.
 */
export async function makeKey(folder: string, options: NewKey): Promise<HeldKey> {
  const { organisation, validFrom: now } = options;
  const authority = await createAuthority({
    ...{ organisation, now },
    leafYears: LEAF_YEARS,
    rootYears: ROOT_YEARS,
  });
  const { keyId, rootKeyId } = authority;
  await mkdir(folder, { recursive: true, mode: 0o700 });
  await writeFile(join(folder, privateKeyFile(keyId)), authority.privateKeyPem, { mode: 0o600 });
  await writeFile(join(folder, certificateFile(keyId)), authority.certificatePem);
  await writeFile(join(folder, certificateFile(rootKeyId)), authority.rootCertificatePem);
  const current: CurrentKey = { keyId, rootKeyId };
  await writeFile(join(folder, `${CURRENT}.new`), JSON.stringify(current, null, 2));
  await rename(join(folder, `${CURRENT}.new`), join(folder, CURRENT));
  return readKey(folder);
}

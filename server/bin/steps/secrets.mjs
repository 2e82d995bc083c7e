import { randomBytes } from 'node:crypto';
import { join } from 'node:path';
import { readJson, writePrivateJson } from './private-files.mjs';
import { newPassphrase } from './words.mjs';

const names = ['SESSION_SECRET', 'DRAW_SECRET', 'SECOND_FACTOR_KEY'];

/** The installation's own random secrets, made once. */
export function ensureSecrets(folder) {
  const path = join(folder, 'secrets.json');
  const kept = readJson(path) ?? {};
  const secrets = Object.fromEntries(
    names.map((name) => [name, kept[name] ?? randomBytes(32).toString('hex')]),
  );
  writePrivateJson(path, secrets);
  return secrets;
}

export const passphrasesFile = (folder) => join(folder, 'passphrases.json');

/** A passphrase for each address, made once: `{ "someone@example": "five small words" }`. */
export function ensurePassphrases(folder, addresses) {
  const path = passphrasesFile(folder);
  const kept = readJson(path) ?? {};
  const passphrases = Object.fromEntries(
    addresses.map((address) => [address, kept[address] ?? newPassphrase()]),
  );
  writePrivateJson(path, passphrases);
  return passphrases;
}

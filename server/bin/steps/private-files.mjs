import { chmodSync, readFileSync, renameSync, writeFileSync } from 'node:fs';

/** Reads a JSON file, or gives undefined when there is none. */
export function readJson(path) {
  try {
    return JSON.parse(readFileSync(path, 'utf8'));
  } catch (error) {
    if (error.code === 'ENOENT') return undefined;
    throw error;
  }
}

/** Writes a file only its owner may read, whole or not at all. */
export function writePrivate(path, text) {
  const draft = `${path}.draft`;
  writeFileSync(draft, text, { mode: 0o600 });
  chmodSync(draft, 0o600);
  renameSync(draft, path);
}

export const writePrivateJson = (path, value) =>
  writePrivate(path, `${JSON.stringify(value, undefined, 2)}\n`);

import 'reflect-metadata';
import pg from 'pg';
import { makeKey, NoSigningKey, readKey } from '../certificates/keys/key-folder.ts';
import { demonstrationSchool } from '../seed/people.ts';

const LOCK = 4_780_003;
/** The demonstration's past begins here; its certificates must fall within the key's time. */
const DEMONSTRATION_FROM = new Date('2023-09-01T00:00:00Z');

function given(name: string): string {
  const value = process.env[name];
  if (value) return value;
  console.error(`${name} is missing.`);
  process.exit(1);
}

if (process.env['DEMONSTRATION'] !== '1') {
  console.error('Keys are made only for a private demonstration; bring your own in KEYS_FOLDER.');
  process.exit(1);
}

async function ensureKey(folder: string): Promise<string> {
  try {
    return `Key ${(await readKey(folder)).keyId} is in use.`;
  } catch (error) {
    // A damaged key is never replaced unasked.
    if (!(error instanceof NoSigningKey && error.isEmpty)) throw error;
    const key = await makeKey(folder, {
      organisation: demonstrationSchool.name,
      validFrom: DEMONSTRATION_FROM,
    });
    return `Key ${key.keyId} was made; its root's private key was not kept.`;
  }
}

/** One process at a time makes keys; the connection's end gives the lock back. */
async function ensureOnce(): Promise<string> {
  const client = new pg.Client({ connectionString: given('MIGRATION_DATABASE_URL') });
  await client.connect();
  try {
    await client.query('SELECT pg_advisory_lock($1)', [LOCK]);
    return await ensureKey(given('KEYS_FOLDER'));
  } finally {
    await client.end();
  }
}

try {
  console.log(await ensureOnce());
} catch (error) {
  console.error(error instanceof Error ? error.message : error);
  process.exitCode = 1;
}

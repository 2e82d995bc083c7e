import 'reflect-metadata';
import { readFile } from 'node:fs/promises';
import { readConfig } from '../config/config.schema.ts';
import { seedDemonstration } from '../seed/seed-demonstration.ts';

const file = process.env['DEMO_PASSPHRASES_FILE'];
if (!file) {
  console.error('DEMO_PASSPHRASES_FILE is missing: the file with a passphrase for each person.');
  process.exit(1);
}
const passphrases = JSON.parse(await readFile(file, 'utf8')) as Record<string, string>;
const isNew = await seedDemonstration(readConfig(process.env), passphrases);
console.log(isNew ? 'The demonstration school is open.' : 'The demonstration school is there.');

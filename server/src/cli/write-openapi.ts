import 'reflect-metadata';
import { writeFile } from 'node:fs/promises';
import { fileURLToPath } from 'node:url';
import { describeApi } from '../openapi.ts';

const target = process.argv[2] ?? fileURLToPath(new URL('../../openapi.json', import.meta.url));
await writeFile(target, await describeApi());

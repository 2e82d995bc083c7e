import { expect, it } from '@jest/globals';
import { readdirSync, readFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { catalogue } from './catalogue.ts';

/** Codes that only Nest's and Fastify's own refusals have. */
const FRAMEWORK_CODES = ['payload-too-large'];

const source = join(dirname(fileURLToPath(import.meta.url)), '..');
const files = readdirSync(source, { recursive: true, encoding: 'utf8' }).filter(
  (path) => path.endsWith('.ts') && !path.endsWith('.spec.ts'),
);
const errors = files.flatMap((path) => {
  const text = readFileSync(join(source, path), 'utf8');
  return text
    .split(/(?=class \w+ extends DomainError)/)
    .filter((piece) => piece.startsWith('class '))
    .map((piece) => ({
      name: /^class (\w+)/.exec(piece)?.[1],
      code: /readonly code(?:: string)? = '([a-z-]+)'/.exec(piece)?.[1],
    }));
});

it('lists the code of every error of ours, and none that nobody raises', () => {
  expect(errors.length).toBeGreaterThan(15);
  const unlisted = errors.filter(({ code }) => code === undefined || !(code in catalogue));
  expect(unlisted).toEqual([]);
  const raised = new Set([...errors.map(({ code }) => code), ...FRAMEWORK_CODES]);
  expect(Object.keys(catalogue).filter((code) => !raised.has(code))).toEqual([]);
});

it('gives each a title and the status of a refusal', () => {
  for (const { status, title } of Object.values(catalogue)) {
    expect(status).toBeGreaterThanOrEqual(400);
    expect(status).toBeLessThan(600);
    expect(title).toMatch(/^[A-Z].*[^.]$/);
  }
});

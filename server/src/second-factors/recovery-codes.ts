import { createHash, randomInt } from 'node:crypto';

/** Figures and letters that are not mistaken for one another. */
const ALPHABET = '23456789abcdefghjkmnpqrstvwxyz';
const GROUPS = 7;
const GROUP_LENGTH = 4;
const COUNT = 8;

const group = () =>
  Array.from({ length: GROUP_LENGTH }, () => ALPHABET[randomInt(ALPHABET.length)]).join('');

/** Eight codes of some 137 random bits each. */
export const newRecoveryCodes = (): string[] =>
  Array.from({ length: COUNT }, () => Array.from({ length: GROUPS }, group).join('-'));

/** The hash of a code as typed: signs, spaces and capitals do not matter. */
export const hashRecoveryCode = (code: string): Buffer =>
  createHash('sha256')
    .update(code.toLowerCase().replaceAll(/[^a-z0-9]/g, ''))
    .digest();

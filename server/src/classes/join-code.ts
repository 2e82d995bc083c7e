import { randomInt } from 'node:crypto';

/** No O or 0, no I or 1: they are read for one another. */
const SIGNS = 'ABCDEFGHJKLMNPQRSTUVWXYZ23456789';

const four = (): string =>
  Array.from({ length: 4 }, () => SIGNS.charAt(randomInt(SIGNS.length))).join('');

/** A code to join a class by, such as "K7QM-X3RT": 40 bits, more than anyone tries through. */
export const newJoinCode = (): string => `${four()}-${four()}`;

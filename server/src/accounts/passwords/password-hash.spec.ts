import { describe, expect, it } from '@jest/globals';
import { TooBusy } from '../accounts.errors.ts';
import { decoyHash, hashPassword, isOutdated, isPassword } from './password-hash.ts';
import { WorkGate } from './work-gate.ts';

describe('a hash', () => {
  it('has a salt of its own, opens for its passphrase however that was typed, and no other', async () => {
    const composed = 'caf\u00e9 au lait at nine';
    const decomposed = 'cafe\u0301 au lait at nine';
    const [first, second] = [await hashPassword(composed), await hashPassword(composed)];
    expect(first).not.toBe(second);
    expect(await isPassword(first, decomposed)).toBe(true);
    expect(await isPassword(first, `${composed} `)).toBe(false);
    expect(await isPassword(await decoyHash(), composed)).toBe(false);
  });

  it.each([
    ['$argon2id$v=19$m=19456,t=2,p=1$c2FsdA$aGFzaA', false],
    ['$argon2id$v=19$m=47104,t=2,p=1$c2FsdA$aGFzaA', false],
    ['$argon2id$v=19$m=8192,t=2,p=1$c2FsdA$aGFzaA', true],
    ['$argon2id$v=19$m=19456,t=1,p=1$c2FsdA$aGFzaA', true],
    ['$argon2i$v=19$m=19456,t=2,p=1$c2FsdA$aGFzaA', true],
    ['$2b$10$abcdefghijklmnopqrstuv', true],
  ])('%s is out of date: %s', (stored, isOld) => {
    expect(isOutdated(stored)).toBe(isOld);
  });
});

describe('the gate', () => {
  it('lets so many run at once, in turn, and turns the rest away', async () => {
    const gate = new WorkGate(2, 3);
    const finish: Array<() => void> = [];
    let running = 0;
    let most = 0;
    const work = () =>
      gate.run(async () => {
        running += 1;
        most = Math.max(most, running);
        await new Promise<void>((resolve) => finish.push(resolve));
        running -= 1;
      });
    const taken = Array.from({ length: 5 }, work);
    await expect(work()).rejects.toThrow(TooBusy);
    for (let n = 0; n < 5; n += 1) {
      finish.shift()?.();
      await new Promise((resolve) => setImmediate(resolve));
    }
    await Promise.all(taken);
    expect([most, running]).toEqual([2, 0]);
  });

  it('gives its place back when the work fails', async () => {
    const gate = new WorkGate(1, 0);
    await expect(gate.run(() => Promise.reject(new Error('failed')))).rejects.toThrow('failed');
    expect(await gate.run(() => Promise.resolve(1))).toBe(1);
  });
});

import { describe, expect, it } from '@jest/globals';
import { secondsToWait, signInAtAccount, signInFromAddress, subscriberOf } from './throttle.ts';

const now = new Date('2026-12-01T10:00:00Z');
const wait = (count: number, agoS = 0, rule = signInAtAccount) =>
  secondsToWait(rule, { count, lastAt: new Date(now.getTime() - agoS * 1_000) }, now);

describe('the wait between tries', () => {
  it('is none before the first try', () => {
    expect(secondsToWait(signInAtAccount, { count: 0, lastAt: null }, now)).toBe(0);
  });

  it.each([
    [4, 0],
    [5, 10],
    [6, 20],
    [10, 320],
    [14, 3_600],
    [99, 3_600],
    [100, 86_400],
    [5_000, 86_400],
  ])('after %i tries is %i seconds', (count, seconds) => {
    expect(wait(count)).toBe(seconds);
  });

  it('runs from the last try', () => {
    expect(wait(6, 15)).toBe(5);
    expect(wait(6, 20)).toBe(0);
  });

  it('at one address begins later and stays short: a classroom shares it', () => {
    expect(wait(59, 0, signInFromAddress)).toBe(0);
    expect(wait(500, 0, signInFromAddress)).toBe(900);
  });
});

describe('the subscriber behind an address', () => {
  it.each([
    ['203.0.113.9', '203.0.113.9'],
    ['::ffff:203.0.113.9', '203.0.113.9'],
    ['2001:db8:1:2:3:4:5:6', '2001:db8:1:2'],
    ['2001:DB8:1:2:ffff::1', '2001:db8:1:2'],
    ['2001:db8::1', '2001:db8:0:0'],
    ['::1', '0:0:0:0'],
  ])('%s is %s', (address, subscriber) => {
    expect(subscriberOf(address)).toBe(subscriber);
  });
});

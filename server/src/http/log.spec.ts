import { describe, expect, it } from '@jest/globals';
import { sayError } from './log.ts';

describe('an error in the log', () => {
  it('keeps what helps to find it and nothing it carries along', () => {
    const client = { connectionParameters: { password: 'a secret' } };
    const error = Object.assign(new TypeError('Connection terminated'), {
      ...{ code: '57P01', client, sql: 'SELECT 1', parameters: ['a secret'] },
    });
    expect(sayError(error)).toEqual({
      ...{ type: 'TypeError', message: 'Connection terminated', code: '57P01' },
      stack: expect.stringContaining('log.spec'),
    });
  });
});

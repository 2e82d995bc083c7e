import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import { readdir, rm } from 'node:fs/promises';
import { join } from 'node:path';
import { createTestApp, type TestApp } from '../../test/test-app.ts';
import { stranger } from '../../test/sign-in.ts';

let test: TestApp;
beforeAll(async () => {
  test = await createTestApp();
});
afterAll(() => test.close());

describe('health', () => {
  it('is alive', async () => {
    expect((await stranger(test.app).call('GET', '/livez')).status).toBe(200);
  });

  it('is ready with its schema and its key', async () => {
    expect((await stranger(test.app).call('GET', '/readyz')).status).toBe(200);
  });

  it('is not ready without a signing key, and says so to this machine', async () => {
    for (const file of await readdir(test.keysFolder)) await rm(join(test.keysFolder, file));
    const reply = await stranger(test.app).call('GET', '/readyz');
    expect(reply.status).toBe(503);
    expect(reply.body.missing).toEqual(['There is no signing key.']);
  });

  it('answers an unknown address with a problem', async () => {
    const reply = await stranger(test.app).call('GET', '/api/nowhere');
    expect(reply.status).toBe(404);
    expect(reply.body.type).toBe('/problems/not-found');
  });

  it('refuses an unsafe request from another site', async () => {
    const reply = await stranger(test.app).call(
      'POST',
      '/api/nowhere',
      {},
      { 'sec-fetch-site': 'cross-site' },
    );
    expect(reply.status).toBe(403);
  });
});

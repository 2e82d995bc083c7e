import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import { createAccount } from '../../test/factories/account.ts';
import { signIn, type Caller } from '../../test/sign-in.ts';
import { createTestApp, type TestApp } from '../../test/test-app.ts';

const PROFILE = '/api/school/practice-profile';

let test: TestApp;
let administrator: Caller;
let administratorId: string;
beforeAll(async () => {
  test = await createTestApp();
  administratorId = (await createAccount(test.app, { roles: ['administrator'] })).id;
  administrator = await signIn(test.app, administratorId);
});
afterAll(() => test.close());

describe('the practice profile of the school', () => {
  it('waits for the school to be entered', async () => {
    const read = await administrator.call('GET', PROFILE);
    const chosen = await administrator.call('PUT', PROFILE, { profile: 'awg' });
    expect([read.status, chosen.status]).toEqual([404, 404]);
    expect(read.body.detail).toContain('not entered');
  });

  it('is metric until an administrator chooses another, and that is kept on record', async () => {
    await test.query(
      `INSERT INTO organisations (kind, name) VALUES ('school', 'Harrow Quay Technical School')`,
    );
    expect((await administrator.call('GET', PROFILE)).body).toEqual({ profile: 'metric' });
    const chosen = await administrator.call('PUT', PROFILE, { profile: 'awg' });
    expect([chosen.status, chosen.body]).toEqual([200, { profile: 'awg' }]);
    expect((await administrator.call('GET', PROFILE)).body).toEqual({ profile: 'awg' });
    const person = await administrator.call('GET', `/api/people/${administratorId}`);
    const lately = (person.body as { lately: { what: string }[] }).lately.map(({ what }) => what);
    expect(lately).toContain('chose the practice profile of the school');
  });

  it('is one of two', async () => {
    const reply = await administrator.call('PUT', PROFILE, { profile: 'imperial' });
    expect([reply.status, reply.body.errors[0].pointer]).toEqual([422, '#/profile']);
  });

  it('is not for trainers or trainees to choose', async () => {
    for (const role of ['trainer', 'trainee'] as const) {
      const { id } = await createAccount(test.app, { roles: [role] });
      const reply = await (await signIn(test.app, id)).call('PUT', PROFILE, { profile: 'awg' });
      expect(reply.status).toBe(403);
    }
  });
});

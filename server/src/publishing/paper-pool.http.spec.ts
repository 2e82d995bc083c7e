import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import { goodFiles, publishFiles } from '../../test/factories/content.ts';
import { createCandidate } from '../../test/factories/sitting.ts';
import { createTestApp, type TestApp } from '../../test/test-app.ts';

let test: TestApp;
beforeAll(async () => {
  test = await createTestApp();
});
afterAll(() => test.close());

const withoutPaperQuestions = () =>
  Object.fromEntries(
    Object.entries(goodFiles()).filter(([, text]) => !/^pool: paper$/m.test(text)),
  );

describe('publishing where the paper pool is kept in the database only', () => {
  it('asks for no paper questions among the sheets, as it does elsewhere', async () => {
    const files = withoutPaperQuestions();
    await expect(publishFiles(test, files)).rejects.toThrow(/try-paper\.md:1:/);
    const { published, leftOut } = await publishFiles(test, files, false);
    expect(published).toContain('blueprint try-paper, revision A');
    expect(leftOut).toBe(0);
  });

  it('leaves the sample paper questions out, and the paper cannot be sat', async () => {
    expect(await publishFiles(test, goodFiles(), false)).toMatchObject({ leftOut: 3 });
    const pools = await test.query('SELECT DISTINCT pool FROM content_revisions WHERE kind = $1', [
      'question',
    ]);
    expect(pools).toEqual([{ pool: 'practice' }]);
    const { caller } = await createCandidate(test);
    const { status, body } = await caller.call('GET', '/api/papers/try-paper');
    expect([status, body.type]).toEqual([409, '/problems/paper-not-ready']);
    await publishFiles(test, goodFiles());
    expect((await caller.call('GET', '/api/papers/try-paper')).status).toBe(200);
  });
});

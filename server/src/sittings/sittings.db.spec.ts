import { afterAll, beforeAll, beforeEach, describe, expect, it, jest } from '@jest/globals';
import { createAccount } from '../../test/factories/account.ts';
import {
  blueprintSheet,
  PAPER,
  publishBlueprint,
  publishPaper,
  publishQuestion,
  questionSheet,
} from '../../test/factories/paper.ts';
import {
  answerAll,
  askToStart,
  createCandidate,
  handIn,
  markWaiting,
  rightAnswers,
  save,
  startPaper,
  typed,
  type Candidate,
} from '../../test/factories/sitting.ts';
import { signIn, type Reply } from '../../test/sign-in.ts';
import { createTestApp, type TestApp } from '../../test/test-app.ts';
import { JobsService } from '../jobs/jobs.service.ts';
import { Marker } from './marker.ts';
import { ResultsRepository } from './results.repository.ts';
import { SittingsRepository } from './sittings.repository.ts';
import type { SittingView } from './sittings.schemas.ts';
import { SittingsService } from './sittings.service.ts';

const TWENTY = Array.from({ length: 20 }, (_, index) => index);

let test: TestApp;
let candidate: Candidate;

beforeAll(async () => {
  test = await createTestApp();
  await publishPaper(test);
});
beforeEach(async () => {
  test.clock.set('2026-12-01T10:00:00Z');
  candidate = await createCandidate(test);
});
afterAll(() => test?.close());

const view = async (from = candidate.caller, id = ''): Promise<SittingView> =>
  (await from.call('GET', `/api/sittings/${id}`)).body as SittingView;
const standing = () => test.app.get(SittingsService).standing(candidate.account.id, PAPER);
const first = (sitting: SittingView) => {
  const [item] = sitting.items;
  if (!item) throw new Error('the paper has no questions');
  return item;
};

/** How many rows of each kind came of one sitting. */
async function whatCameOf(sittingId: string) {
  const [row] = await test.query<Record<string, number>>(
    `SELECT (SELECT count(*)::int FROM sitting_results WHERE sitting_id = $1) AS results,
            (SELECT count(*)::int FROM decisions WHERE sitting_id = $1) AS decisions,
            (SELECT count(*)::int FROM certificates c JOIN decisions d ON d.id = c.decision_id
              WHERE d.sitting_id = $1) AS certificates,
            (SELECT count(*)::int FROM mail_messages WHERE dedupe_key LIKE '%' || $1::text) AS mails`,
    [sittingId],
  );
  return row;
}

describe('starting', () => {
  it('opens one paper when twenty ask at once', async () => {
    const replies = await Promise.all(TWENTY.map(() => askToStart(candidate)));
    const opened = replies.filter(({ status }) => status === 201);
    expect(opened).toHaveLength(1);
    const refused = replies.filter(({ status }) => status === 409);
    expect(refused).toHaveLength(19);
    for (const { body } of refused) {
      expect(body).toMatchObject({
        type: '/problems/sitting-already-open',
        sittingId: opened[0]?.body.id,
      });
    }
  });

  it('asks to read rules that have changed again', async () => {
    const reply = await askToStart(candidate, { agreementHash: '0'.repeat(64) });
    expect(reply.body.type).toBe('/problems/agreement-changed');
    expect((await standing()).sittings).toEqual([]);
  });

  it('gives two candidates different figures and different names of questions', async () => {
    const other = await createCandidate(test);
    const [mine, theirs] = [await startPaper(candidate), await startPaper(other)];
    const keys = (sitting: SittingView) => sitting.items.map(({ key }) => key);
    expect(new Set([...keys(mine), ...keys(theirs)]).size).toBe(6);
    expect(mine.items.map(({ question }) => question.given)).not.toEqual(
      theirs.items.map(({ question }) => question.given),
    );
  });

  it('waits until the last paper is marked', async () => {
    await handIn(candidate.caller, await startPaper(candidate));
    expect((await askToStart(candidate)).body.type).toBe('/problems/result-not-ready');
    expect((await standing()).state).toBe('waiting');
  });

  it('is refused to someone who holds the certificate', async () => {
    const sitting = await startPaper(candidate);
    await answerAll(candidate.caller, sitting);
    await handIn(candidate.caller, sitting);
    await markWaiting(test);
    const { state, certificateId } = await standing();
    expect(state).toBe('passed');
    const reply = await askToStart(candidate);
    expect(reply.body).toMatchObject({ type: '/problems/already-certified', certificateId });
    test.clock.set('2029-12-02T10:00:00Z');
    expect((await standing()).state).toBe('open');
  });

  it('is refused until the waiting time after a failed paper is over', async () => {
    await handIn(candidate.caller, await startPaper(candidate));
    await markWaiting(test);
    const mayStartAt = '2026-12-15T00:00:00.000Z';
    test.clock.set('2026-12-14T23:59:59Z');
    candidate = { ...candidate, caller: await signIn(test.app, candidate.account.id) };
    expect(await standing()).toMatchObject({ state: 'waiting', mayStartAt });
    expect((await askToStart(candidate)).body).toMatchObject({
      ...{ type: '/problems/wait-not-over', mayStartAt },
    });
    test.clock.set(mayStartAt);
    expect((await askToStart(candidate)).status).toBe(201);
  });

  it('gives the extra time that was approved', async () => {
    const manager = await createAccount(test.app, { roles: ['certification-manager'] });
    const desk = await signIn(test.app, manager.id);
    const { email } = candidate.account;
    const reason = 'Agreed with the school in writing.';
    const granted = await desk.call('POST', '/api/time-allowances', { email, percent: 25, reason });
    expect(granted.status).toBe(201);
    const sitting = await startPaper(candidate);
    expect(sitting).toMatchObject({ minutes: 56.25, closesAt: '2026-12-01T10:56:15.000Z' });
  });
});

describe('the terms', () => {
  it('stay as they were at the start when questions and rules are published anew', async () => {
    const sitting = await startPaper(candidate);
    for (const id of ['vd-one', 'vd-two', 'vd-three', 'rd-one', 'rd-two']) {
      const subject = id.startsWith('rd') ? 'RD' : 'VD';
      await publishQuestion(test, questionSheet({ id, subject, revision: 'B', title: 'Changed' }));
    }
    await publishBlueprint(test, blueprintSheet({ revision: 'B', minutes: 10, passMark: 100 }));
    expect(await view(candidate.caller, sitting.id)).toEqual(sitting);
    await answerAll(candidate.caller, { ...sitting, items: sitting.items.slice(1) });
    const item = first(sitting);
    const answer = rightAnswers(item).a;
    await save(candidate.caller, { sitting, item, part: 'a' }, { answer, sequence: 99 });
    await handIn(candidate.caller, sitting);
    await markWaiting(test);
    const result = await candidate.caller.call('GET', `/api/sittings/${sitting.id}/result`);
    expect(result.body).toMatchObject({ marks: 14, passMarks: 13, passPercent: 70, passed: true });
    const later = await startPaper(await createCandidate(test));
    expect(later).toMatchObject({ minutes: 10, passPercent: 100 });
    expect(first(later).question.title).toBe('Changed');
    await publishBlueprint(test, blueprintSheet({ revision: 'C' }));
  });
});

describe('the end', () => {
  it('comes once, with one result, one mail and one certificate', async () => {
    const sitting = await startPaper(candidate);
    await answerAll(candidate.caller, sitting);
    const jobs = test.app.get(JobsService);
    test.clock.advance(45);
    const handedIn = await Promise.all([
      ...TWENTY.map(() => handIn(candidate.caller, sitting)),
      jobs.enqueue('close-sitting', { sittingId: sitting.id }).then(() => markWaiting(test)),
    ]);
    const replies = handedIn.filter((reply): reply is Reply => typeof reply !== 'number');
    expect(new Set(replies.map(({ status }) => status))).toEqual(new Set([200]));
    expect(new Set(replies.map(({ body }) => String(body.handedInAt))).size).toBe(1);
    await jobs.enqueue('mark-sitting', { sittingId: sitting.id });
    await Promise.all([markWaiting(test), markWaiting(test)]);
    expect(await whatCameOf(sitting.id)).toEqual({
      ...{ results: 1, decisions: 1, certificates: 1, mails: 1 },
    });
  });

  it('comes at the deadline to someone who never returns, with what was saved', async () => {
    const sitting = await startPaper(candidate);
    await answerAll(candidate.caller, sitting);
    const [job] = await test.query<{ start_after: Date }>(
      `SELECT start_after FROM jobs.job WHERE name = 'close-sitting' AND data->>'sittingId' = $1`,
      [sitting.id],
    );
    expect(job?.start_after).toEqual(new Date('2026-12-01T10:45:03Z'));
    const jobs = test.app.get(JobsService);
    test.clock.set('2026-12-01T10:45:02Z');
    await jobs.enqueue('close-sitting', { sittingId: sitting.id });
    await markWaiting(test);
    expect(await whatCameOf(sitting.id)).toMatchObject({ results: 0 });
    test.clock.set('2026-12-01T10:45:03Z');
    await jobs.enqueue('close-sitting', { sittingId: sitting.id });
    await markWaiting(test);
    const result = await candidate.caller.call('GET', `/api/sittings/${sitting.id}/result`);
    expect(result.body).toMatchObject({ handedInHow: 'at-the-deadline', marks: 18, passed: true });
    expect(await view(candidate.caller, sitting.id)).toMatchObject({
      ...{ state: 'handed-in', handedInAt: '2026-12-01T10:45:00.000Z', items: [] },
    });
  });

  it('refuses an answer after the time and tells when it closed', async () => {
    const sitting = await startPaper(candidate);
    const place = { sitting, item: first(sitting), part: 'a' };
    const answer = typed('0.1', 'V');
    test.clock.set('2026-12-01T10:45:02Z');
    const kept = { answer, sequence: 1, idempotencyKey: '7d0a3c1e-52cf-4c27-b4fb-0f6a3a9c0b11' };
    const inTime = await save(candidate.caller, place, kept);
    expect(inTime.status).toBe(200);
    test.clock.set('2026-12-01T10:45:02.001Z');
    const late = await save(candidate.caller, place, { answer, sequence: 2 });
    expect(late).toMatchObject({ status: 409 });
    expect(late.body).toMatchObject({
      ...{ type: '/problems/sitting-closed', closedAt: '2026-12-01T10:45:00.000Z' },
    });
    const again = await save(candidate.caller, place, kept);
    expect(again.body.receipt).toBe(inTime.body.receipt);
    await markWaiting(test);
    expect(await whatCameOf(sitting.id)).toMatchObject({ results: 1, mails: 1 });
  });

  it('is seen by any look after the deadline', async () => {
    const sitting = await startPaper(candidate);
    test.clock.advance(46);
    expect(await standing()).toMatchObject({ state: 'waiting', sittingId: null });
    expect((await view(candidate.caller, sitting.id)).handedInHow).toBe('at-the-deadline');
  });
});

describe('marking', () => {
  it('begins with the hand-in: saving does not mark', async () => {
    await markWaiting(test);
    const mark = jest.spyOn(test.app.get(Marker), 'mark');
    const sitting = await startPaper(candidate);
    await answerAll(candidate.caller, sitting);
    await view(candidate.caller, sitting.id);
    await markWaiting(test);
    expect(mark).not.toHaveBeenCalled();
    await handIn(candidate.caller, sitting);
    expect(mark).not.toHaveBeenCalled();
    await markWaiting(test);
    expect(mark).toHaveBeenCalledTimes(1);
    mark.mockRestore();
  });

  it('comes out the same when every stored paper is marked again', async () => {
    const sittings = await test.query<{ sitting_id: string }>(
      'SELECT sitting_id FROM sitting_results',
    );
    expect(sittings.length).toBeGreaterThan(4);
    for (const { sitting_id } of sittings) {
      const found = await test.app.get(SittingsRepository).find(sitting_id);
      const stored = await test.app.get(ResultsRepository).find(sitting_id);
      if (!found || !stored) throw new Error(`sitting ${sitting_id} is not whole`);
      const { marks, outOf, passed, bySubject, marked, markerVersion } = stored;
      expect(await test.app.get(Marker).mark(found.sitting)).toEqual({
        ...{ marks, outOf, passed, bySubject, marked, markerVersion },
      });
    }
  });
});

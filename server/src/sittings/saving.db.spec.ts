import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import fc from 'fast-check';
import { randomUUID } from 'node:crypto';
import { publishPaper } from '../../test/factories/paper.ts';
import { createCandidate, handIn, save, startPaper, typed } from '../../test/factories/sitting.ts';
import { signIn, type Caller, type Reply } from '../../test/sign-in.ts';
import { createTestApp, type TestApp } from '../../test/test-app.ts';
import type { SittingView } from './sittings.schemas.ts';

let test: TestApp;
beforeAll(async () => {
  test = await createTestApp();
  await publishPaper(test);
});
afterAll(() => test?.close());

const look = async (caller: Caller, { id }: { id: string }): Promise<SittingView> =>
  (await caller.call('GET', `/api/sittings/${id}`)).body as SittingView;

async function openPaper() {
  const candidate = await createCandidate(test);
  const sitting = await startPaper(candidate);
  const [item] = sitting.items;
  if (!item) throw new Error('the paper has no questions');
  return { ...candidate, sitting, item, place: { sitting, item, part: 'a' } };
}

describe('saving', () => {
  it('keeps the highest sequence that arrived, however the answers travelled', async () => {
    const deliveries = fc.integer({ min: 1, max: 8 }).chain((count) =>
      fc.array(fc.record({ draft: fc.integer({ min: 1, max: count }), withNext: fc.boolean() }), {
        minLength: 1,
        maxLength: 14,
      }),
    );
    await fc.assert(
      fc.asyncProperty(deliveries, async (list) => {
        const { caller, sitting, item } = await openPaper();
        const receipts = new Map<number, Set<string>>();
        const keys = new Map<number, string>();
        const deliver = async (draft: number) => {
          const part = draft % 2 === 0 ? 'a' : 'b';
          const idempotencyKey = keys.get(draft) ?? randomUUID();
          keys.set(draft, idempotencyKey);
          const body = { answer: typed(`0.${draft}`, 'V'), sequence: draft, idempotencyKey };
          const reply = await save(caller, { sitting, item, part }, body);
          expect(reply.status).toBe(200);
          receipts.set(draft, (receipts.get(draft) ?? new Set()).add(String(reply.body.receipt)));
        };
        let inFlight: Promise<void>[] = [];
        for (const { draft, withNext } of list) {
          inFlight.push(deliver(draft));
          if (withNext) continue;
          await Promise.all(inFlight);
          inFlight = [];
        }
        await Promise.all(inFlight);
        for (const seen of receipts.values()) expect(seen.size).toBe(1);
        const after = await look(caller, sitting);
        const arrived = [...receipts.keys()];
        for (const [part, odd] of [
          ['a', 0],
          ['b', 1],
        ] as const) {
          const highest = Math.max(0, ...arrived.filter((draft) => draft % 2 === odd));
          const kept = after.items[0]?.answers[part];
          expect(kept?.sequence ?? 0).toBe(highest);
          if (kept) expect(kept.text).toBe(`0.${highest}`);
        }
        expect(after.receipts).toHaveLength(arrived.length);
      }),
      { numRuns: 15 },
    );
  });

  it('gives a receipt to quote and says how the answer was read', async () => {
    const { caller, place, item, sitting } = await openPaper();
    const reply = await save(caller, place, { answer: typed('48,1', 'mV'), sequence: 19 });
    expect(reply.body).toMatchObject({
      sequence: 19,
      reading: { state: 'understood', shown: '48.1 mV' },
      closesAt: sitting.closesAt,
    });
    expect(reply.body.receipt).toMatch(/^F1-[2-9A-HJ-NP-Z]{4}-19$/);
    const asked = await save(caller, place, { answer: typed('1,234', 'mV'), sequence: 20 });
    expect(asked.body.reading).toMatchObject({ state: 'ambiguous' });
    const strange = await save(caller, place, { answer: typed('a lot'), sequence: 21 });
    expect(strange.body.reading.state).toBe('not-understood');
    const after = await look(caller, sitting);
    expect(after.items.find(({ key }) => key === item.key)?.answers['a']).toMatchObject({
      ...{ text: 'a lot', sequence: 21, receipt: strange.body.receipt },
    });
  });

  it('refuses a second answer under a sequence or a key that was used', async () => {
    const { caller, place } = await openPaper();
    const idempotencyKey = randomUUID();
    await save(caller, place, { answer: typed('1', 'V'), sequence: 5, idempotencyKey });
    const other = await save(caller, place, { answer: typed('2', 'V'), sequence: 5 });
    expect(other).toMatchObject({ status: 409 });
    expect(other.body).toMatchObject({ type: '/problems/sequence-used', highest: 5 });
    const reused = { answer: typed('2', 'V'), sequence: 6, idempotencyKey };
    expect((await save(caller, place, reused)).status).toBe(422);
  });

  it('asks the database a handful of things, however long the paper is', async () => {
    const { caller, sitting, place } = await openPaper();
    await save(caller, place, { answer: typed('1', 'V'), sequence: 1 });
    const asked = await test.countQueries(() =>
      save(caller, place, { answer: typed('2', 'V'), sequence: 2 }),
    );
    // The session, then BEGIN, the sitting, the question, the answer and COMMIT.
    expect(asked).toBeLessThanOrEqual(6);
    const toLook = await test.countQueries(() => look(caller, sitting));
    expect(toLook).toBeLessThanOrEqual(6);
  });

  it('answers only after a commit that is durable', async () => {
    expect(await test.query('SHOW synchronous_commit')).toEqual([{ synchronous_commit: 'on' }]);
  });

  it('keeps a pennant on a question to come back to', async () => {
    const { caller, sitting, item } = await openPaper();
    const path = `/api/sittings/${sitting.id}/items/${item.key}/come-back`;
    for (const comeBack of [true, true, false, false, true]) {
      const reply = await caller.call('PUT', path, { comeBack });
      expect(reply.body).toEqual({ comeBack });
      expect((await look(caller, sitting)).items[0]?.comeBack).toBe(comeBack);
    }
  });
});

describe('carrying on', () => {
  it('finds the same questions, answers and time on another device', async () => {
    const { account, caller, sitting, place } = await openPaper();
    await save(caller, place, { answer: typed('0.5', 'V'), sequence: 1 });
    const before = await look(caller, sitting);
    test.clock.advance(20);
    const elsewhere = await signIn(test.app, account.id);
    const after = await look(elsewhere, sitting);
    expect(after).toEqual({ ...before, now: test.clock.now().toISOString(), readOnly: true });
    expect(after.closesAt).toBe(sitting.closesAt);
    test.clock.set('2026-12-01T10:00:00Z');
  });

  it('lets one device write at a time', async () => {
    const { account, caller, sitting, place } = await openPaper();
    const elsewhere = await signIn(test.app, account.id);
    const takenOver = (reply: Reply) =>
      expect(reply).toMatchObject({ status: 409, body: { type: '/problems/taken-over' } });
    const write = (from: Caller, sequence: number) =>
      save(from, place, { answer: typed(String(sequence), 'V'), sequence });
    takenOver(await write(elsewhere, 1));
    takenOver(await handIn(elsewhere, sitting));
    const taken = await elsewhere.call('POST', `/api/sittings/${sitting.id}/take-over`, {});
    expect(taken.body.readOnly).toBe(false);
    takenOver(await write(caller, 2));
    takenOver(
      await caller.call('PUT', `/api/sittings/${sitting.id}/items/${place.item.key}/come-back`, {
        comeBack: true,
      }),
    );
    expect((await look(caller, sitting)).readOnly).toBe(true);
    expect((await write(elsewhere, 3)).status).toBe(200);
    expect((await look(caller, sitting)).items[0]?.answers['a']?.sequence).toBe(3);
    expect((await handIn(elsewhere, sitting)).status).toBe(200);
    expect((await handIn(caller, sitting)).status).toBe(200);
  });

  it('leaves the winner of two devices saving and taking over at once able to write', async () => {
    const { account, caller, sitting, place } = await openPaper();
    const elsewhere = await signIn(test.app, account.id);
    const replies = await Promise.all([
      ...[1, 2, 3].map((n) => save(caller, place, { answer: typed(`${n}`, 'V'), sequence: n })),
      elsewhere.call('POST', `/api/sittings/${sitting.id}/take-over`, {}),
      ...[11, 12].map((n) => save(elsewhere, place, { answer: typed(`${n}`, 'V'), sequence: n })),
    ]);
    expect(replies.every(({ status }) => status === 200 || status === 409)).toBe(true);
    const saved = replies.filter(({ status, body }) => status === 200 && 'receipt' in body);
    expect((await look(elsewhere, sitting)).receipts).toHaveLength(saved.length);
    expect((await save(caller, place, { answer: typed('9', 'V'), sequence: 90 })).status).toBe(409);
    expect((await save(elsewhere, place, { answer: typed('9', 'V'), sequence: 91 })).status).toBe(
      200,
    );
  });
});

import { randomUUID } from 'node:crypto';
import { JobsService } from '../../src/jobs/jobs.service.ts';
import type { SittingView } from '../../src/sittings/sittings.schemas.ts';
import { signIn, type Caller, type Reply } from '../sign-in.ts';
import type { TestApp } from '../test-app.ts';
import { createAccount, type TestAccount } from './account.ts';
import { PAPER } from './paper.ts';

type Item = SittingView['items'][number];

export interface Candidate {
  readonly account: TestAccount;
  readonly caller: Caller;
}

export async function createCandidate(test: TestApp): Promise<Candidate> {
  const account = await createAccount(test.app);
  return { account, caller: await signIn(test.app, account.id) };
}

export const typed = (text: string, unit: string | null = null) => ({
  ...{ text, unit, option: null, working: '' },
});

/** The right answers, worked out from what the candidate sees. */
export function rightAnswers({ question }: Item) {
  const given = (symbol: string) =>
    Number(question.given.find((one) => one.symbol === symbol)?.value ?? NaN);
  const drop = (given('I') * given('R')) / 1000;
  const choice = question.parts.find(({ id }) => id === 'c')?.options;
  return {
    a: typed(drop.toFixed(4), 'V'),
    b: typed((drop * 2).toFixed(4), 'V'),
    c: { ...typed(''), option: choice?.find(({ text }) => text === 'Thicker cable')?.id ?? null },
  };
}

/** Asks to start the paper with the agreement as it reads now. */
export async function askToStart(candidate: Candidate, more: object = {}): Promise<Reply> {
  const { caller, account } = candidate;
  const paper = await caller.call('GET', `/api/papers/${PAPER}`);
  return caller.call('POST', '/api/sittings', {
    ...{ paper: PAPER, agreed: true, agreementHash: paper.body.agreementHash },
    ...{ givenName: account.givenName, familyName: account.familyName },
    ...more,
  });
}

export async function startPaper(candidate: Candidate): Promise<SittingView> {
  const reply = await askToStart(candidate);
  if (reply.status !== 201) throw new Error(JSON.stringify(reply.body));
  return reply.body as SittingView;
}

interface Place {
  readonly sitting: Pick<SittingView, 'id'>;
  readonly item: Pick<Item, 'key'>;
  readonly part: string;
}

export function save(caller: Caller, place: Place, body: object): Promise<Reply> {
  const { sitting, item, part } = place;
  return caller.call('PUT', `/api/sittings/${sitting.id}/items/${item.key}/parts/${part}`, {
    ...{ idempotencyKey: randomUUID(), ...body },
  });
}

/** Answers every part of the paper right, or none. */
export async function answerAll(caller: Caller, sitting: SittingView): Promise<void> {
  let sequence = 0;
  for (const item of sitting.items) {
    for (const [part, answer] of Object.entries(rightAnswers(item))) {
      sequence += 1;
      const reply = await save(caller, { sitting, item, part }, { answer, sequence });
      if (reply.status !== 200) throw new Error(JSON.stringify(reply.body));
    }
  }
}

export const handIn = (caller: Caller, sitting: Pick<SittingView, 'id'>): Promise<Reply> =>
  caller.call('POST', `/api/sittings/${sitting.id}/hand-in`, {});

/** Closes and marks what waits; certificates are drawn and letters sent by others. */
export const markWaiting = (test: TestApp): Promise<number> =>
  test.app.get(JobsService).runWaiting(['close-sitting', 'mark-sitting']);

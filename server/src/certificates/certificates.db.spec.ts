import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import fc from 'fast-check';
import { randomBytes } from 'node:crypto';
import {
  askEverywhere,
  certify,
  checkFile,
  createCertified,
  fileOf,
  type Certified,
} from '../../test/factories/certificate.ts';
import { countQueries } from '../../test/count-queries.ts';
import { publishPaper } from '../../test/factories/paper.ts';
import { signIn } from '../../test/sign-in.ts';
import { createTestApp, type TestApp } from '../../test/test-app.ts';
import {
  CertificateRecordsRepository,
  type CertificatePlace,
} from './certificate-records.repository.ts';
import type { CertificateRecord } from './certificate.ts';
import { CertificateViewsService } from './certificate-views.service.ts';
import type { CertificateView } from './certificates.schemas.ts';
import { CertificatesService } from './certificates.service.ts';
import { DrawingService } from './drawing.service.ts';
import { makeKey } from './keys/key-folder.ts';
import { SigningKeysService } from './keys/signing-keys.service.ts';
import { NameCorrectionsService } from './name-corrections.service.ts';
import { WithdrawalsService } from './withdrawals.service.ts';
import { createAccount, type TestAccount } from '../../test/factories/account.ts';

let test: TestApp;
let administrator: TestAccount;
beforeAll(async () => {
  test = await createTestApp();
  await publishPaper(test);
  administrator = await createAccount(test.app, { roles: ['administrator'] });
});
afterAll(() => test?.close());

const service = <T>(type: new (...parts: never[]) => T): T =>
  test.app.get<T>(type, { strict: false });
const act = (certificateId: string) => ({
  ...{ certificateId, actor: administrator, address: '127.0.0.1' },
  reason: 'Asked for by the school',
});
const rows = <T extends object>(sql: string, ...bind: unknown[]) => test.query<T>(sql, bind);

const insertCopy = (certificateId: string, decisionId: string | null) =>
  rows(
    `INSERT INTO certificates (number, link_code, account_id, decision_id, scheme_id, holder_name,
                               family_fold, how_sat, issued_at, issued_on, expires_on)
     SELECT $2, $3, account_id, $4, scheme_id, holder_name, family_fold, how_sat, issued_at,
            issued_on, expires_on FROM certificates WHERE id = $1 RETURNING id`,
    ...[certificateId, randomBytes(8).toString('hex'), randomBytes(16).toString('base64url')],
    decisionId,
  );

describe('a certificate', () => {
  it('cannot be without a decision, nor share one', async () => {
    const { certificateId } = await certify(test);
    const [{ decision_id: decisionId } = { decision_id: '' }] = await rows<{ decision_id: string }>(
      'SELECT decision_id FROM certificates WHERE id = $1',
      certificateId,
    );
    await expect(insertCopy(certificateId, null)).rejects.toThrow('null value');
    await expect(insertCopy(certificateId, decisionId)).rejects.toThrow();
    const [unpaired] = await rows<{ count: string }>(
      `SELECT count(*) AS count FROM decisions d FULL JOIN certificates c ON c.decision_id = d.id
        WHERE d.id IS NULL OR c.id IS NULL`,
    );
    expect(unpaired?.count).toBe('0');
  });

  it.each(['decisions', 'certificates', 'certificate_files', 'certificate_events'])(
    'is never changed or removed by the server: %s',
    async (table) => {
      await expect(rows(`DELETE FROM ${table} RETURNING 1`)).rejects.toThrow('permission denied');
      const column =
        table === 'decisions'
          ? 'account_id'
          : table === 'certificates'
            ? 'number'
            : 'certificate_id';
      await expect(rows(`UPDATE ${table} SET ${column} = ${column} RETURNING 1`)).rejects.toThrow(
        'permission denied',
      );
    },
  );

  it('is decided with its evidence and rules, once for a sitting', async () => {
    const { sittingId } = await certify(test);
    const [decision] = await rows<{ outcome: string; evidence: object; rules: object }>(
      'SELECT outcome, evidence, rules FROM decisions WHERE sitting_id = $1',
      sittingId,
    );
    expect(decision).toEqual({
      outcome: 'certify',
      evidence: { sittingId },
      rules: { paper: 'try-paper' },
    });
  });

  it.each([
    ['2026-12-01T10:00:00Z', '2026-12-01', '2029-12-01'],
    ['2028-02-29T12:00:00Z', '2028-02-29', '2031-02-28'],
    // Half past midnight in London, where the scheme is.
    ['2027-06-30T23:30:00Z', '2027-07-01', '2030-07-01'],
  ])('issued at %s is dated %s and expires on %s', async (instant, issuedOn, expiresOn) => {
    test.clock.set(instant);
    const { certificateId } = await certify(test);
    const [dates] = await rows(
      `SELECT issued_on::text AS "issuedOn", expires_on::text AS "expiresOn" FROM certificates WHERE id = $1`,
      certificateId,
    );
    expect(dates).toEqual({ issuedOn, expiresOn });
  });

  it('is valid to the end of its last day in the zone of the scheme', async () => {
    test.clock.set('2026-06-30T10:00:00Z');
    const { account } = await certify(test);
    const heldAt = (instant: string) =>
      service(CertificatesService).heldBy(account.id, 'dc-installer', new Date(instant));
    expect(await heldAt('2029-06-30T22:59:59Z')).not.toBeNull();
    expect(await heldAt('2029-06-30T23:00:00Z')).toBeNull();
  });
});

describe('drawing', () => {
  beforeAll(() => test.clock.set('2026-12-01T10:00:00Z'));

  it('gives one file and one mail when several jobs run at once', async () => {
    const { certificateId, account } = await certify(test);
    const drawing = service(DrawingService);
    await Promise.all([1, 2, 3].map(() => drawing.draw(certificateId)));
    await drawing.draw(certificateId);
    const files = await rows(
      'SELECT 1 FROM certificate_files WHERE certificate_id = $1',
      certificateId,
    );
    const mails = await rows(
      'SELECT template FROM mail_messages WHERE account_id = $1',
      account.id,
    );
    expect([files.length, mails]).toEqual([1, [{ template: 'certificate-issued' }]]);
  });

  it('says nothing to the holder of a certificate that was withdrawn before', async () => {
    const { certificateId, account } = await certify(test);
    await service(WithdrawalsService).withdraw(act(certificateId));
    await test.runJobs();
    const mails = await rows(
      'SELECT template FROM mail_messages WHERE account_id = $1',
      account.id,
    );
    expect(mails).toEqual([{ template: 'certificate-withdrawn' }]);
  });

  it('is done with the key in use; files of an earlier key still verify', async () => {
    const before = await createCertified(test);
    const keys = service(SigningKeysService);
    const first = await keys.current();
    await makeKey(test.keysFolder, {
      organisation: 'Harrow Quay Technical School',
      validFrom: test.clock.now(),
    });
    // As a new start of the server would.
    Object.assign(keys, { held: undefined });
    test.clock.advance(1);
    const after = await createCertified(test);
    expect((await keys.current()).keyId).not.toBe(first.keyId);
    const signers = await rows<{ key_id: string }>(
      'SELECT key_id FROM certificate_files WHERE certificate_id = ANY ($1::uuid[]) ORDER BY signed_at',
      [before.certificate.id, after.certificate.id],
    );
    expect(signers.map(({ key_id }) => key_id)).toEqual([
      first.keyId,
      (await keys.current()).keyId,
    ]);
    for (const certified of [before, after]) {
      expect(await checkFile(test, await fileOf(certified))).toMatchObject({
        file: 'the-very-file',
        number: certified.certificate.number,
      });
    }
  });

  it('stops when the time of the key is over', async () => {
    const { certificateId } = await certify(test);
    test.clock.set('2036-01-01T00:00:00Z');
    await expect(service(DrawingService).draw(certificateId)).rejects.toThrow('may sign from');
    test.clock.set('2026-12-01T10:00:00Z');
    await test.runJobs();
  });
});

describe('the end of a certificate', () => {
  it('comes once when withdrawals and corrections run at once', async () => {
    const { certificateId } = await certify(test);
    const name = { givenName: 'Ifeoma', familyName: 'Castellane' };
    const acts = [1, 2].flatMap(() => [
      service(WithdrawalsService).withdraw(act(certificateId)),
      service(NameCorrectionsService).correct(act(certificateId), name),
    ]);
    const results = await Promise.allSettled(acts);
    const refusals = results.flatMap((one) =>
      one.status === 'rejected' ? [(one.reason as Error).name] : [],
    );
    expect(refusals).toHaveLength(acts.length - 1);
    for (const refusal of refusals) {
      expect(['CertificateWithdrawn', 'CertificateReplaced', 'EndedMeanwhile']).toContain(refusal);
    }
    const ends = await rows(
      `SELECT kind FROM certificate_events WHERE certificate_id = $1 AND kind <> 'issued'`,
      certificateId,
    );
    expect(ends).toHaveLength(1);
    const [loose] = await rows<{ count: string }>(
      `SELECT count(*) AS count FROM certificates c JOIN decisions d ON d.id = c.decision_id
        WHERE d.outcome = 'correct-name'
          AND NOT EXISTS (SELECT 1 FROM certificate_events e WHERE e.replaced_by = c.id)`,
    );
    expect(loose?.count).toBe('0');
  });

  it('is followed to the certificate that counts when a sitting is looked up', async () => {
    const { certificateId, sittingId } = await certify(test);
    const corrected = await service(NameCorrectionsService).correct(act(certificateId), {
      givenName: 'Ifeoma',
      familyName: 'Castellano',
    });
    expect((await service(CertificatesService).ofSitting(sittingId))?.id).toBe(corrected);
  });
});

describe('the list at the desk', () => {
  it('shows every certificate once, page after page, the newest first', async () => {
    const records = service(CertificateRecordsRepository);
    const now = test.clock.now();
    const wanted = { numberPart: '', namePart: '', nameFold: '' };
    const whole = await records.page({ ...wanted, after: null, most: 1_000 }, now);
    const paged: string[] = [];
    let after: CertificatePlace | null = null;
    do {
      const page: CertificateRecord[] = await records.page({ ...wanted, after, most: 3 }, now);
      paged.push(...page.map(({ id }) => id));
      after = page.at(-1) ?? null;
    } while (after);
    expect(paged).toEqual(whole.map(({ id }) => id));
    expect(whole.length).toBeGreaterThan(5);
    const times = whole.map(({ issuedAt }) => issuedAt.getTime());
    expect(times).toEqual(times.toSorted((a, b) => b - a));
  });

  it('takes as many statements for many certificates as for one', async () => {
    const views = service(CertificateViewsService);
    const many = await countQueries(test, () => views.page({ find: '', cursor: '' }));
    const [newest] = (await views.page({ find: '', cursor: '' })).certificates;
    const one = await countQueries(test, () =>
      views.page({ find: newest?.number ?? '', cursor: '' }),
    );
    expect([many, one]).toEqual([2, 2]);
  });
});

type Happening = 'withdraw' | 'correct' | 'wait two years';
const happenings = fc.array(fc.constantFrom<Happening>('withdraw', 'correct', 'wait two years'), {
  minLength: 1,
  maxLength: 4,
});

/** One certificate and those that replaced it, with what each must say. */
class Line {
  readonly held: { certified: Certified; file: Buffer; state: string }[] = [];
  private years = 0;

  async begin(): Promise<void> {
    test.clock.set('2026-12-01T10:00:00Z');
    const certified = await createCertified(test);
    this.held.push({ certified, file: await fileOf(certified), state: 'valid' });
  }

  async let(happening: Happening): Promise<void> {
    const last = this.held.at(-1);
    if (!last) return;
    if (happening === 'wait two years') return this.wait();
    const attempt = this.attempt(happening, last.certified.certificate.id);
    if (last.state === 'withdrawn') return expect(attempt).rejects.toThrow('for good');
    const replacement = await attempt;
    const { state } = last;
    last.state = replacement ? 'superseded' : 'withdrawn';
    if (replacement) this.held.push({ ...replacement, state });
  }

  private wait(): void {
    if (this.years >= 4) return;
    this.years += 2;
    test.clock.set(`${2026 + this.years}-12-01T10:00:00Z`);
    if (this.years < 4) return;
    for (const one of this.held) if (one.state === 'valid') one.state = 'expired';
  }

  private async attempt(happening: 'withdraw' | 'correct', id: string) {
    if (happening === 'withdraw') return service(WithdrawalsService).withdraw(act(id));
    const givenName = `Ifeoma ${'I'.repeat(this.held.length)}`;
    const name = { givenName, familyName: 'Castellan' };
    const correctedId = await service(NameCorrectionsService).correct(act(id), name);
    await test.runJobs();
    const { account } = this.held[0]?.certified ?? (await createCertified(test));
    const caller = await signIn(test.app, account.id);
    const { body } = await caller.call('GET', `/api/certificates/${correctedId}`);
    const certified = { account, caller, certificate: body as CertificateView };
    return { certified, file: await fileOf(certified) };
  }
}

describe('whatever happens to a certificate', () => {
  it('its holder, the register and the check of its file say the same', async () => {
    let address = 0;
    await fc.assert(
      fc.asyncProperty(happenings, async (events) => {
        const line = new Line();
        await line.begin();
        for (const event of events) {
          await line.let(event);
          address += 1;
          for (const { certified, file, state } of line.held) {
            const { account, certificate } = certified;
            const caller = await signIn(test.app, account.id);
            const own = await caller.call('GET', `/api/certificates/${certificate.id}`);
            const answers = await askEverywhere(test, {
              ...{ certificate, file, familyName: 'Castellan', address: `192.0.2.${address}` },
            });
            expect([own.body.state, ...answers.map(({ answer }) => answer)]).toEqual(
              Array(5).fill(state),
            );
          }
        }
      }),
      { numRuns: 6 },
    );
  });
});

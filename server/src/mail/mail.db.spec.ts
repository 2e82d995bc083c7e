import { afterAll, beforeAll, beforeEach, describe, expect, it } from '@jest/globals';
import { getConnectionToken } from '@nestjs/sequelize';
import { randomUUID } from 'node:crypto';
import MailComposer from 'nodemailer/lib/mail-composer/index.js';
import PostalMime from 'postal-mime';
import { QueryTypes, type Sequelize } from 'sequelize';
import { createTestApp, type TestApp } from '../../test/test-app.ts';
import { Transactions } from '../database/transactions.ts';
import { JobsService } from '../jobs/jobs.service.ts';
import { MailService } from './mail.service.ts';
import type { Letter } from './letter.ts';

let test: TestApp;
beforeAll(async () => {
  test = await createTestApp();
});
afterAll(() => test.close());
beforeEach(() => {
  test.mails.failure = null;
});

const letter = (more: Partial<Letter> = {}): Letter => ({
  template: 'confirm-email',
  to: { name: '', email: `${randomUUID()}@people.example` },
  accountId: null,
  dedupeKey: randomUUID(),
  values: { url: 'https://ferrule.example/confirm#KEY' },
  ...more,
});

const queue = (written: Letter) => test.app.get(MailService).queue(written);

async function row(dedupeKey: string) {
  const rows = await test.app
    .get<Sequelize>(getConnectionToken())
    .query<Record<string, unknown>>('SELECT * FROM mail_messages WHERE dedupe_key = $1', {
      bind: [dedupeKey],
      type: QueryTypes.SELECT,
    });
  return rows[0];
}

describe('the outbox', () => {
  it('sends a mail once, however often it is queued under its key', async () => {
    const written = letter();
    await queue(written);
    await queue(written);
    await test.runJobs();
    await test.runJobs();
    const sent = test.mails.sent.filter(
      ({ to }) => (to as { address: string }).address === written.to.email,
    );
    expect(sent).toHaveLength(1);
    expect(await row(written.dedupeKey)).toMatchObject({ state: 'sent', tries: 0 });
  });

  it('leaves nothing behind when the transaction around it fails', async () => {
    const written = letter();
    const failing = test.app.get(Transactions).run(async () => {
      await queue(written);
      throw new Error('rolled back');
    });
    await expect(failing).rejects.toThrow('rolled back');
    expect(await row(written.dedupeKey)).toBeUndefined();
    expect(await test.runJobs()).toBe(0);
  });

  it('does not keep a link that opens something once the mail has left', async () => {
    const written = letter();
    await queue(written);
    expect(String((await row(written.dedupeKey))?.['body_text'])).toContain('#KEY');
    await test.runJobs();
    expect(JSON.stringify(await row(written.dedupeKey))).not.toContain('#KEY');
    expect(test.mails.lastTo(written.to.email)?.text).toContain('#KEY');
  });

  it('keeps the reason and tries again when the mail server is away', async () => {
    const written = letter();
    await queue(written);
    test.mails.failure = new Error('connect ECONNREFUSED');
    await expect(test.runJobs()).rejects.toThrow('ECONNREFUSED');
    expect(await row(written.dedupeKey)).toMatchObject({
      state: 'queued',
      tries: 1,
      last_error: 'connect ECONNREFUSED',
    });
    test.mails.failure = null;
    await test.app.get(JobsService).enqueue('send-mail', {
      messageId: String((await row(written.dedupeKey))?.['id']),
    });
    await test.runJobs();
    expect(await row(written.dedupeKey)).toMatchObject({
      state: 'sent',
      tries: 1,
      last_error: null,
    });
  });

  it('gives up at once, with the reason, when the mail server refuses for good', async () => {
    const written = letter();
    await queue(written);
    test.mails.failure = Object.assign(new Error('550 no such mailbox'), { responseCode: 550 });
    await test.runJobs();
    expect(await row(written.dedupeKey)).toMatchObject({
      state: 'failed',
      tries: 1,
      last_error: '550 no such mailbox',
    });
  });

  it('refuses a letter without its values', async () => {
    await expect(queue(letter({ values: {} }))).rejects.toThrow('The letter lacks url.');
  });
});

describe('a mail as it leaves', () => {
  async function parsed(written: Letter) {
    await queue(written);
    await test.runJobs();
    const options = test.mails.lastTo(written.to.email);
    const raw = await new MailComposer(options ?? {}).compile().build();
    return { raw: raw.toString('latin1'), mail: await PostalMime.parse(raw) };
  }
  const header = (mail: Awaited<ReturnType<typeof PostalMime.parse>>, name: string) =>
    mail.headers.find(({ key }) => key === name)?.value;

  it('has text first, HTML after it, and the headers of automatic mail', async () => {
    const { raw, mail } = await parsed(letter());
    expect(header(mail, 'content-type')).toMatch(/^multipart\/alternative/);
    expect(raw.indexOf('text/plain')).toBeLessThan(raw.indexOf('text/html'));
    expect(header(mail, 'auto-submitted')).toBe('auto-generated');
    expect(mail.messageId).toMatch(/^<[0-9a-f-]{36}@harrow-quay\.example>$/);
    expect(new Date(mail.date ?? '').toISOString()).toBe('2026-12-01T10:00:00.000Z');
    expect(mail.from?.address).toBe('office@harrow-quay.example');
  });

  it('says the same in text and HTML: every figure and every link', async () => {
    const { mail } = await parsed(
      letter({
        template: 'result-not-passed',
        values: {
          givenName: 'Zoë',
          paperNumber: 'HQ-P1',
          paperTitle: 'Final paper',
          satOn: '24 Nov 2026',
          marks: '21',
          outOf: '36',
          percent: '58',
          passPercent: '70',
          maySitAgainOn: '8 Dec 2026',
          bySubject: 'Voltage drop\t3 of 12\nCharging\t18 of 24',
          url: 'https://ferrule.example/sittings/1/result',
        },
      }),
    );
    const visible = (mail.html ?? '')
      .replace(/^[\s\S]*?<table/, '<table')
      .replaceAll(/<[^>]+>/g, ' ');
    const figures = (text: string) => [...new Set(text.match(/\d+/g))].sort();
    const links = (text: string) => [...new Set(text.match(/https:[^\s"<]+/g))].sort();
    const text = mail.text ?? '';
    expect(figures(visible)).toEqual(figures(text.replaceAll(/https:\S+/g, '')));
    expect(links(mail.html?.replace(/<html[^>]*>/, '') ?? '')).toEqual(links(text));
    for (const fact of ['3 of 12', '18 of 24', '8 Dec 2026', 'Zoë']) {
      expect(text).toContain(fact);
      expect(visible).toContain(fact);
    }
  });

  it.each([
    'Zoë Nguyễn-Łukasiewicz',
    'Hemi Tāwhiri\r\nBcc: somebody@else.example',
    'Quist"; <x@y.example>, ',
    'A B C',
  ])('carries the name %j in one header and to one address', async (name) => {
    const email = `${randomUUID()}@people.example`;
    const { raw, mail } = await parsed(letter({ to: { name, email } }));
    expect(mail.to?.map(({ address }) => address)).toEqual([email]);
    expect(mail.bcc).toBeUndefined();
    const head = raw.slice(0, raw.indexOf('\r\n\r\n'));
    expect(head).toMatch(/^[\x20-\x7e\r\n\t]*$/);
    expect(head).not.toMatch(/^bcc:/im);
    const shown = name.replaceAll(/[\r\n\u2028]+/g, ' ').trim();
    expect(mail.to?.[0]?.name).toBe(shown);
  });

  it('shows markup in a value as text', async () => {
    const { mail } = await parsed(
      letter({
        template: 'password-changed',
        values: { changedAt: '<b>now</b>', resetUrl: 'https://x.example/"' },
      }),
    );
    expect(mail.html).toContain('&lt;b&gt;now&lt;/b&gt;');
    expect(mail.html).toContain('href="https://x.example/&quot;"');
  });
});

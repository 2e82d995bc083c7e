import { Test } from '@nestjs/testing';
import type { NestFastifyApplication } from '@nestjs/platform-fastify';
import type { SendMailOptions } from 'nodemailer';
import { getConnectionToken } from '@nestjs/sequelize';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { QueryTypes, type Sequelize } from 'sequelize';
import { AppModule } from '../src/app.module.ts';
import { createAdapter, setUpApp } from '../src/app.setup.ts';
import { makeKey } from '../src/certificates/keys/key-folder.ts';
import { Clock } from '../src/clock/clock.ts';
import { readConfig } from '../src/config/config.schema.ts';
import { serveSite } from '../src/http/serve-site.ts';
import { JobsService } from '../src/jobs/jobs.service.ts';
import { MailTransport } from '../src/mail/mail-transport.ts';
import { createTestDatabase, type TestDatabase } from './test-database.ts';

/** A clock that stands where it is put. */
export class SetClock extends Clock {
  private at = new Date('2026-12-01T10:00:00Z');

  override now(): Date {
    return new Date(this.at);
  }

  override agreed(): Date {
    return this.now();
  }

  set(instant: string | Date): void {
    this.at = new Date(instant);
  }

  advance(minutes: number): void {
    this.at = new Date(this.at.getTime() + minutes * 60_000);
  }
}

/** Keeps what would be sent, in order. */
export class KeptMails {
  readonly sent: SendMailOptions[] = [];
  /** Set to make the next mails fail with it. */
  failure: Error | null = null;

  async send(mail: SendMailOptions): Promise<void> {
    if (this.failure) throw this.failure;
    this.sent.push(mail);
  }

  /** The newest mail to an address. */
  lastTo(email: string): SendMailOptions | undefined {
    return this.sent.findLast(({ to }) => (to as { address: string }).address === email);
  }
}

export interface TestApp {
  readonly app: NestFastifyApplication;
  readonly clock: SetClock;
  readonly database: TestDatabase;
  readonly mails: KeptMails;
  /** Where the signing key of this app is. */
  readonly keysFolder: string;
  /** Runs every waiting job, and those they enqueue. */
  runJobs(): Promise<number>;
  /** Looks straight into the database, with the server's role. */
  query<T extends object>(sql: string, bind?: unknown[]): Promise<T[]>;
  /** How many statements the work sent to the database. */
  countQueries(work: () => Promise<unknown>): Promise<number>;
  close(): Promise<void>;
}

export const PUBLIC_URL = 'http://127.0.0.1:4780';

interface TestAppOptions {
  readonly publicUrl?: string;
  /** A built site to serve. */
  readonly siteFolder?: string;
}

function testConfig(webUrl: string, keysFolder: string, publicUrl: string) {
  return readConfig({
    NODE_ENV: 'test',
    JOB_WORKERS: '0',
    DEMONSTRATION: '1',
    PUBLIC_URL: publicUrl,
    DATABASE_URL: webUrl,
    DATABASE_POOL: '6',
    SESSION_SECRET: 'a1'.repeat(32),
    DRAW_SECRET: 'b2'.repeat(32),
    SECOND_FACTOR_KEY: 'c3'.repeat(32),
    SMTP_URL: 'smtp://127.0.0.1:1',
    MAIL_FROM: 'Harrow Quay <office@harrow-quay.example>',
    KEYS_FOLDER: keysFolder,
  });
}

/** The whole server on a database of its own; only the clock and the mail server are replaced. */
export async function createTestApp(options: TestAppOptions = {}): Promise<TestApp> {
  const database = await createTestDatabase();
  const keysFolder = mkdtempSync(join(tmpdir(), 'ferrule-keys-'));
  await makeKey(keysFolder, {
    organisation: 'Harrow Quay Technical School',
    validFrom: new Date('2023-09-01T00:00:00Z'),
  });
  const clock = new SetClock();
  const mails = new KeptMails();
  const config = testConfig(database.webUrl, keysFolder, options.publicUrl ?? PUBLIC_URL);
  const testing = await Test.createTestingModule({ imports: [AppModule.with(config)] })
    .overrideProvider(Clock)
    .useValue(clock)
    .overrideProvider(MailTransport)
    .useValue(mails)
    .compile();
  const app = testing.createNestApplication<NestFastifyApplication>(createAdapter(config));
  await setUpApp(app, config);
  if (options.siteFolder !== undefined) await serveSite(app, options.siteFolder);
  await app.init();
  await app.getHttpAdapter().getInstance().ready();
  return {
    app,
    clock,
    database,
    mails,
    keysFolder,
    runJobs: () => app.get(JobsService).runWaiting(),
    query: <T extends object>(sql: string, bind: unknown[] = []) =>
      app.get<Sequelize>(getConnectionToken()).query<T>(sql, { bind, type: QueryTypes.SELECT }),
    countQueries: async (work) => {
      const sequelize = app.get<Sequelize>(getConnectionToken());
      let count = 0;
      sequelize.addHook('beforeQuery', 'count', () => {
        count += 1;
      });
      await work();
      sequelize.removeHook('beforeQuery', 'count');
      return count;
    },
    close: async () => {
      await app.close();
      await database.drop();
      rmSync(keysFolder, { recursive: true, force: true });
    },
  };
}

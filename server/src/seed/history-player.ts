import type { INestApplicationContext } from '@nestjs/common';
import { getConnectionToken } from '@nestjs/sequelize';
import { keyAnswers, type DrawnQuestion } from '@ferrule/assessments';
import { randomUUID } from 'node:crypto';
import { QueryTypes, type Sequelize } from 'sequelize';
import type { SignedInAccount } from '../accounts/account.ts';
import type { CertificateAct } from '../certificates/certificate-act.ts';
import { CertificateViewsService } from '../certificates/certificate-views.service.ts';
import { WithdrawalsService } from '../certificates/withdrawals.service.ts';
import { ClassesService } from '../classes/classes.service.ts';
import { JobsService } from '../jobs/jobs.service.ts';
import { LessonsService } from '../lessons/lessons.service.ts';
import { PapersService } from '../papers/papers.service.ts';
import { PracticeService } from '../practice/practice.service.ts';
import { QuestionsService } from '../questions/questions.service.ts';
import { SessionsService } from '../sessions/sessions.service.ts';
import { SavingService } from '../sittings/saving.service.ts';
import { SittingsService } from '../sittings/sittings.service.ts';
import { WorksheetsService } from '../worksheets/worksheets.service.ts';
import type { Happening } from './history.ts';
import { demonstrationClass } from './people.ts';
import { SchoolBooks } from './school.ts';
import type { TravellingClock } from './travelling-clock.ts';

const PAPER = 'final-paper';
const MINUTES_A_QUESTION = 4;

interface StoredItem {
  key: string;
  revisionId: string;
  drawn: DrawnQuestion;
}

/** Lets the invented past happen through the same services that serve the present. */
export class HistoryPlayer {
  private readonly sequelize: Sequelize;
  private readonly books: SchoolBooks;

  constructor(
    private readonly app: INestApplicationContext,
    private readonly clock: TravellingClock,
  ) {
    this.sequelize = app.get<Sequelize>(getConnectionToken(), { strict: false });
    this.books = new SchoolBooks(this.sequelize);
  }

  async play(happening: Happening): Promise<void> {
    this.clock.travelTo(happening.at);
    const accountId = await this.books.accountId(happening.who);
    await this.books.noteSeen(accountId, happening.at);
    switch (happening.does) {
      case 'join':
        await this.service(ClassesService).join(accountId, demonstrationClass.joinCode);
        return;
      case 'read':
        await this.service(LessonsService).readTo(accountId, happening.sheet, happening.paragraph);
        return;
      case 'finish':
        await this.finish(accountId, happening.sheet);
        return;
      case 'worksheet':
        await this.work(accountId, happening);
        return;
      case 'practise':
        await this.practise(accountId, happening);
        return;
      case 'paper':
        await this.sit(accountId, happening);
        return;
      case 'lose certificate':
        await this.withdraw(accountId, happening);
    }
  }

  private async withdraw(
    accountId: string,
    { who, by, reason }: Extract<Happening, { does: 'lose certificate' }>,
  ): Promise<void> {
    const { certificates } = await this.service(CertificateViewsService).ofAccount(accountId);
    const [certificate] = certificates;
    const [actor] = await this.rows<CertificateAct['actor']>(
      `SELECT id, given_name AS "givenName", family_name AS "familyName"
         FROM accounts WHERE email = $1`,
      [by],
    );
    if (!certificate || !actor) throw new Error(`${by} cannot withdraw what ${who} holds.`);
    await this.service(WithdrawalsService).withdraw({
      ...{ actor, reason, certificateId: certificate.id },
      address: '',
    });
  }

  private async finish(accountId: string, sheet: string): Promise<void> {
    const lessons = this.service(LessonsService);
    const { current } = await lessons.progress(accountId, sheet);
    await lessons.markDone(accountId, sheet, current);
  }

  private async work(
    accountId: string,
    { at, number, slipped }: Extract<Happening, { does: 'worksheet' }>,
  ): Promise<void> {
    const worksheets = this.service(WorksheetsService);
    const { id } = await worksheets.start(accountId, number);
    const items = await this.rows<{ items: StoredItem[] }>(
      'SELECT items FROM worksheet_attempts WHERE id = $1',
      [id],
    );
    this.clock.travelTo(new Date(Date.parse(at) + 25 * 60_000).toISOString());
    for (const [index, item] of (items[0]?.items ?? []).entries()) {
      const answers = await this.answers(item, slipped[index] ?? []);
      await worksheets.save({ accountId, id, key: item.key }, answers);
    }
    await worksheets.handIn(accountId, id);
  }

  private async practise(
    accountId: string,
    { question, left, slipped }: Extract<Happening, { does: 'practise' }>,
  ): Promise<void> {
    const practice = this.service(PracticeService);
    const { id, asked } = await practice.start(accountId, { question, left });
    const [item] = await this.rows<Pick<StoredItem, 'revisionId' | 'drawn'>>(
      `SELECT question_revision_id AS "revisionId", drawn -> 'drawn' AS drawn
         FROM practice_attempts WHERE id = $1`,
      [id],
    );
    if (!item) throw new Error(`Practice of ${question} was not kept.`);
    const answers = Object.entries(await this.answers(item, slipped));
    await practice.answer(
      accountId,
      id,
      Object.fromEntries(answers.filter(([part]) => asked.includes(part))),
    );
  }

  private async sit(
    accountId: string,
    { at, wrongFromEnd }: Extract<Happening, { does: 'paper' }>,
  ): Promise<void> {
    const account = await this.signIn(accountId);
    const { agreementHash } = await this.service(PapersService).current(PAPER);
    const { givenName, familyName } = account;
    const { id } = await this.service(SittingsService).start(account, {
      ...{ paper: PAPER, agreed: true, agreementHash, givenName, familyName },
    });
    const items = await this.rows<StoredItem>(
      `SELECT key, question_revision_id AS "revisionId", drawn
         FROM sitting_items WHERE sitting_id = $1 ORDER BY number`,
      [id],
    );
    for (const [index, item] of items.entries()) {
      const minutes = (index + 1) * MINUTES_A_QUESTION;
      this.clock.travelTo(new Date(Date.parse(at) + minutes * 60_000).toISOString());
      const isWrong = index >= items.length - wrongFromEnd;
      await this.write(account, { id, item, isWrong });
    }
    await this.service(SittingsService).handIn(account, id);
    await this.service(JobsService).runWaiting(['mark-sitting', 'draw-certificate']);
  }

  private async write(
    account: SignedInAccount,
    { id, item, isWrong }: { id: string; item: StoredItem; isWrong: boolean },
  ): Promise<void> {
    const right = await this.answers(item, []);
    const parts = Object.keys(right);
    const given = isWrong ? await this.answers(item, parts) : right;
    for (const [part, answer] of Object.entries(given)) {
      await this.service(SavingService).save(
        account,
        { id, key: item.key, part },
        { answer, sequence: 1, idempotencyKey: randomUUID() },
      );
    }
  }

  private async answers(
    { revisionId, drawn }: Pick<StoredItem, 'revisionId' | 'drawn'>,
    slipped: readonly string[],
  ) {
    const { question } = await this.service(QuestionsService).byRevision(revisionId);
    return keyAnswers(question, drawn, slipped);
  }

  private async signIn(accountId: string): Promise<SignedInAccount> {
    const sessions = this.service(SessionsService);
    const { id: sessionId } = await sessions.open(accountId, {
      device: 'School desk',
      address: '',
    });
    const [row] = await this.rows<{ given_name: string; family_name: string; email: string }>(
      'SELECT given_name, family_name, email FROM accounts WHERE id = $1',
      [accountId],
    );
    return {
      ...{ id: accountId, sessionId, roles: ['trainee'], email: row?.email ?? '' },
      ...{ givenName: row?.given_name ?? '', familyName: row?.family_name ?? '' },
      ...{ authenticatedAt: this.clock.now(), secondFactorAt: null },
    };
  }

  private service<T>(type: new (...parts: never[]) => T): T {
    return this.app.get<T>(type, { strict: false });
  }

  private rows<T extends object>(sql: string, bind: unknown[]): Promise<T[]> {
    return this.sequelize.query<T>(sql, { bind, type: QueryTypes.SELECT });
  }
}

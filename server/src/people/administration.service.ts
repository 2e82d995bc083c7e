import { Injectable } from '@nestjs/common';
import type { Role, SignedInAccount } from '../accounts/account.ts';
import { AddressAsksService } from '../accounts/address-asks.service.ts';
import { SecurityEventsService } from '../audit/security-events.service.ts';
import { Clock } from '../clock/clock.ts';
import { Transactions } from '../database/transactions.ts';
import type { RequestSource } from '../http/request-source.decorator.ts';
import { NotFound } from '../problems/common.errors.ts';
import { SessionsService } from '../sessions/sessions.service.ts';
import { LastAdministrator, NotOnOneself } from './people.errors.ts';
import { PeopleRepository } from './people.repository.ts';
import type { PersonView } from './people.schemas.ts';
import { presentPerson } from './person.presenter.ts';

/** Who acts on whom, and from where. */
export interface Act {
  readonly actor: SignedInAccount;
  readonly source: RequestSource;
  readonly personId: string;
}

/** What an administrator does to accounts. It counts from the person's next request on. */
@Injectable()
export class AdministrationService {
  constructor(
    private readonly repository: PeopleRepository,
    private readonly sessions: SessionsService,
    private readonly asks: AddressAsksService,
    private readonly events: SecurityEventsService,
    private readonly transactions: Transactions,
    private readonly clock: Clock,
  ) {}

  giveRole(act: Act, role: Role): Promise<PersonView> {
    return this.onPerson(act, async () => {
      const by = { id: act.actor.id, at: this.clock.now() };
      const isNew = await this.repository.addRole(act.personId, role, by);
      if (isNew) await this.note('role-given', act, { role });
    });
  }

  /** @throws {NotOnOneself | LastAdministrator} */
  takeRole(act: Act, role: Role): Promise<PersonView> {
    return this.onPerson(act, async () => {
      if (role === 'administrator') await this.spareAdministrator(act, 'take their own role');
      const had = await this.repository.removeRole(act.personId, role);
      if (had) await this.note('role-taken', act, { role });
    });
  }

  /** @throws {NotOnOneself | LastAdministrator} */
  suspend(act: Act, reason: string): Promise<PersonView> {
    return this.onPerson(act, async () => {
      await this.spareAdministrator(act, 'suspend themselves');
      await this.repository.setSuspension(act.personId, { at: this.clock.now(), reason });
      await this.sessions.endAll(act.personId);
      await this.note('suspended', act, { reason });
    });
  }

  reinstate(act: Act): Promise<PersonView> {
    return this.onPerson(act, async () => {
      await this.repository.setSuspension(act.personId, null);
      await this.note('reinstated', act);
    });
  }

  /** The person gets a link; the administrator neither sets nor sees the passphrase. */
  async startReset(act: Act): Promise<void> {
    await this.onPerson(act, async () => {
      await this.asks.sendResetLink(act.personId);
      await this.note('password-reset-started', act);
    });
  }

  async endSessions(act: Act): Promise<void> {
    await this.onPerson(act, async () => {
      await this.sessions.endAll(act.personId);
      await this.note('sessions-ended', act);
    });
  }

  private async onPerson(act: Act, work: () => Promise<void>): Promise<PersonView> {
    return this.transactions.run(async () => {
      await this.require(act.personId);
      await work();
      return presentPerson(await this.require(act.personId));
    });
  }

  private async require(personId: string) {
    const person = await this.repository.find(personId, this.clock.now());
    if (!person) throw new NotFound('There is nobody under this address.');
    return person;
  }

  /** There is always somebody left who can give roles. */
  private async spareAdministrator({ actor, personId }: Act, what: string): Promise<void> {
    if (actor.id === personId) throw new NotOnOneself(`An administrator cannot ${what}.`);
    await this.repository.lockAdministrators();
    const { roles } = await this.require(personId);
    if (!roles.includes('administrator')) return;
    const others = await this.repository.countOtherAdministrators(personId);
    if (others === 0) throw new LastAdministrator();
  }

  private note(kind: string, act: Act, detail: Record<string, string> = {}): Promise<void> {
    return this.events.record({
      kind,
      accountId: act.personId,
      actorId: act.actor.id,
      address: act.source.address,
      detail,
    });
  }
}

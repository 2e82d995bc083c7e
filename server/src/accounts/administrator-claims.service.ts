import { Injectable } from '@nestjs/common';
import { SecurityEventsService } from '../audit/security-events.service.ts';
import { Clock } from '../clock/clock.ts';
import { Transactions } from '../database/transactions.ts';
import type { RequestSource } from '../http/request-source.decorator.ts';
import { InvalidRequest } from '../problems/common.errors.ts';
import { AccountTokensService } from './account-tokens.service.ts';
import { AdministratorExists } from './accounts.errors.ts';
import { AccountsRepository } from './accounts.repository.ts';
import type { Accepted, ClaimAdministrator } from './accounts.schemas.ts';
import { SchoolsRepository } from './schools.repository.ts';
import { requireGoodPassword } from './password-choice.ts';
import { hashPassword } from './passwords/password-hash.ts';

/** The first administrator and the school of a new installation, by the link its start prints. */
@Injectable()
export class AdministratorClaimsService {
  constructor(
    private readonly accounts: AccountsRepository,
    private readonly schools: SchoolsRepository,
    private readonly tokens: AccountTokensService,
    private readonly events: SecurityEventsService,
    private readonly transactions: Transactions,
    private readonly clock: Clock,
  ) {}

  /** @throws {LinkNotValid | AdministratorExists} */
  async claim(
    { token, password, schoolName, schoolAddress, ...person }: ClaimAdministrator,
    source: RequestSource,
  ): Promise<Accepted> {
    await this.tokens.look('claim-administrator', token);
    requireGoodPassword(password, person);
    const passwordHash = await hashPassword(password);
    await this.transactions.run(async () => {
      await this.accounts.lockAdministrators();
      await this.tokens.use('claim-administrator', token);
      if (await this.accounts.hasAdministrator()) throw new AdministratorExists();
      const account = { ...person, passwordHash };
      const accountId = await this.accounts.addAdministrator(account, this.clock.now());
      if (accountId === null) throw emailTaken();
      await this.schools.addUnlessThere({ name: schoolName, address: schoolAddress });
      await this.events.record({
        kind: 'administrator-claimed',
        accountId,
        actorId: accountId,
        address: source.address,
      });
    });
    return {};
  }
}

const emailTaken = () =>
  new InvalidRequest([
    { pointer: '#/email', detail: 'This email has an account already. Use another one.' },
  ]);

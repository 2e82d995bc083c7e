import { Injectable } from '@nestjs/common';
import { InjectConnection } from '@nestjs/sequelize';
import { Sequelize, type Transaction } from 'sequelize';
import { ambientTransaction } from './ambient-transaction.ts';

/** Opens transactions. A call inside another joins it. */
@Injectable()
export class Transactions {
  constructor(@InjectConnection() private readonly sequelize: Sequelize) {}

  async run<T>(work: () => Promise<T>): Promise<T> {
    if (ambientTransaction()) return work();
    return this.sequelize.transaction(() => work());
  }

  /** The raw connection of the open transaction, for what must commit with it. */
  current(): Transaction | undefined {
    return ambientTransaction() as Transaction | undefined;
  }
}

import {
  Inject,
  Injectable,
  type OnApplicationBootstrap,
  type OnApplicationShutdown,
} from '@nestjs/common';
import PgBoss from 'pg-boss';
import { CONFIG } from '../config/config.module.ts';
import type { Config } from '../config/config.schema.ts';
import { Transactions } from '../database/transactions.ts';
import { log } from '../http/log.ts';
import { QUEUES, type JobPayloads, type QueueName } from './queues.ts';

export const JOBS_SCHEMA = 'jobs';

type Handler = (payload: object) => Promise<void>;

interface RawConnection {
  query(text: string, values: unknown[]): Promise<{ rows: unknown[] }>;
}

/**
 * Work that must not hold up a request. A job enqueued inside a transaction commits or
 * vanishes with it; a handler may run more than once and must do its work only once.
 */
@Injectable()
export class JobsService implements OnApplicationBootstrap, OnApplicationShutdown {
  private readonly boss: PgBoss;
  private readonly handlers = new Map<QueueName, Handler>();
  private readonly hasWorkers: boolean;

  constructor(
    @Inject(CONFIG) config: Config,
    private readonly transactions: Transactions,
  ) {
    this.hasWorkers = config.JOB_WORKERS === '1';
    this.boss = new PgBoss({
      connectionString: config.DATABASE_URL,
      schema: JOBS_SCHEMA,
      migrate: false,
      supervise: this.hasWorkers,
      schedule: this.hasWorkers,
      max: 4,
      application_name: 'ferrule-jobs',
    });
    this.boss.on('error', (error) => log.error({ err: error }, 'job queue'));
  }

  /** Names what does a queue's work. Call in a constructor or `onModuleInit`. */
  handle<Q extends QueueName>(queue: Q, handler: (payload: JobPayloads[Q]) => Promise<void>): void {
    this.handlers.set(queue, handler as Handler);
  }

  async onApplicationBootstrap(): Promise<void> {
    await this.boss.start();
    if (!this.hasWorkers) return;
    for (const [queue, handler] of this.handlers) {
      await this.boss.work<object>(queue, { pollingIntervalSeconds: 1 }, async (jobs) => {
        for (const job of jobs) await handler(job.data);
      });
    }
  }

  async onApplicationShutdown(): Promise<void> {
    await this.boss.stop({ graceful: true, timeout: 10_000, wait: true });
  }

  async enqueue<Q extends QueueName>(
    queue: Q,
    payload: JobPayloads[Q],
    startAfter?: Date,
  ): Promise<void> {
    const options: PgBoss.SendOptions = {
      retryLimit: 8,
      retryDelay: 5,
      retryBackoff: true,
      ...(startAfter ? { startAfter } : {}),
    };
    const connection = this.openConnection();
    if (connection) {
      options.db = { executeSql: (text, values) => connection.query(text, values) };
    }
    await this.boss.send(queue, payload, options);
  }

  /** Runs what waits now, in turn, until nothing is left: for a process without workers. */
  async runWaiting(queues: readonly QueueName[] = QUEUES): Promise<number> {
    let ran = 0;
    for (let before = -1; before !== ran;) {
      before = ran;
      for (const queue of queues) ran += await this.runQueue(queue);
    }
    return ran;
  }

  private async runQueue(queue: QueueName): Promise<number> {
    const handler = this.handlers.get(queue);
    const jobs = handler ? await this.boss.fetch<object>(queue, { batchSize: 50 }) : [];
    for (const job of jobs) {
      await handler?.(job.data);
      await this.boss.complete(queue, job.id);
    }
    return jobs.length;
  }

  private openConnection(): RawConnection | undefined {
    const transaction = this.transactions.current() as { connection?: RawConnection } | undefined;
    return transaction?.connection;
  }
}

import PgBoss from 'pg-boss';
import pg from 'pg';
import { JOBS_SCHEMA } from './jobs.service.ts';
import { QUEUES, SCHEDULES } from './queues.ts';

/** The job library's own queue for what is due by the clock; the server may not make it. */
const CLOCK_QUEUE = '__pgboss__send-it';

/** Makes the job schema and its queues with the owner's role and lets the server use them. */
export async function migrateJobs(ownerUrl: string): Promise<void> {
  const boss = new PgBoss({
    connectionString: ownerUrl,
    schema: JOBS_SCHEMA,
    supervise: false,
    schedule: false,
    max: 1,
  });
  boss.on('error', () => undefined);
  await boss.start();
  const known = new Set((await boss.getQueues()).map(({ name }) => name));
  for (const queue of [CLOCK_QUEUE, ...QUEUES]) {
    if (!known.has(queue)) await boss.createQueue(queue);
  }
  for (const { queue, cron, hoursAtMost } of SCHEDULES) {
    await boss.schedule(queue, cron, {}, { tz: 'UTC', expireInHours: hoursAtMost, retryLimit: 1 });
  }
  await boss.stop({ graceful: false, wait: true });
  const client = new pg.Client({ connectionString: ownerUrl });
  await client.connect();
  await client.query(`
    GRANT USAGE ON SCHEMA ${JOBS_SCHEMA} TO ferrule_web;
    GRANT SELECT, INSERT, UPDATE, DELETE ON ALL TABLES IN SCHEMA ${JOBS_SCHEMA} TO ferrule_web;
    GRANT EXECUTE ON ALL FUNCTIONS IN SCHEMA ${JOBS_SCHEMA} TO ferrule_web;`);
  await client.end();
}

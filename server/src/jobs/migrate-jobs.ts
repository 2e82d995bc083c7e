import PgBoss from 'pg-boss';
import pg from 'pg';
import { JOBS_SCHEMA } from './jobs.service.ts';
import { QUEUES } from './queues.ts';

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
  for (const queue of QUEUES) if (!known.has(queue)) await boss.createQueue(queue);
  await boss.stop({ graceful: false, wait: true });
  const client = new pg.Client({ connectionString: ownerUrl });
  await client.connect();
  await client.query(`
    GRANT USAGE ON SCHEMA ${JOBS_SCHEMA} TO ferrule_web;
    GRANT SELECT, INSERT, UPDATE, DELETE ON ALL TABLES IN SCHEMA ${JOBS_SCHEMA} TO ferrule_web;
    GRANT EXECUTE ON ALL FUNCTIONS IN SCHEMA ${JOBS_SCHEMA} TO ferrule_web;`);
  await client.end();
}

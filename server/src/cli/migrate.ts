import { migrate } from '../database/migrator.ts';
import { migrateJobs } from '../jobs/migrate-jobs.ts';

const ownerUrl = process.env['MIGRATION_DATABASE_URL'];
if (!ownerUrl) {
  console.error(
    'MIGRATION_DATABASE_URL is missing: the address of the database with the owner role.',
  );
  process.exit(1);
}
const ran = await migrate(ownerUrl);
await migrateJobs(ownerUrl);
console.log(ran.length === 0 ? 'The schema is up to date.' : `Applied ${ran.join(', ')}.`);

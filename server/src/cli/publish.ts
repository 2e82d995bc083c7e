import { fileURLToPath } from 'node:url';
import { ContentNotInOrder } from '../publishing/problem-list.ts';
import { publish } from '../publishing/publish.ts';
import { summariseNotes } from '../publishing/summarise.ts';

const checkout = (folder: string) => fileURLToPath(new URL(`../../../${folder}`, import.meta.url));

const ownerUrl = process.env['MIGRATION_DATABASE_URL'];
if (!ownerUrl) {
  console.error(
    'MIGRATION_DATABASE_URL is missing: the address of the database with the owner role.',
  );
  process.exit(1);
}
const [lessons = checkout('lessons'), assessments = checkout('assessments')] =
  process.argv.slice(2);
try {
  const withPaperPool = process.env['DEMONSTRATION'] === '1';
  const report = await publish(ownerUrl, { lessons, assessments, withPaperPool });
  for (const name of report.published) console.log(`Published ${name}.`);
  const leftOut =
    report.leftOut > 0
      ? ` ${report.leftOut} sample paper questions left out: a school keeps its paper pool in its database only.`
      : '';
  console.log(
    `${report.published.length} published, ${report.unchanged} unchanged.${leftOut}${summariseNotes(report.notes)}`,
  );
} catch (error) {
  if (!(error instanceof ContentNotInOrder)) throw error;
  console.error(error.message);
  const count = error.problems.length;
  console.error(`${count} ${count === 1 ? 'problem' : 'problems'}; nothing was published.`);
  process.exitCode = 1;
}

import { openRemarking } from '../remarking/open-remarking.ts';
import type { Difference } from '../remarking/remark.ts';
import type { Progress } from '../remarking/remarking.service.ts';

const databaseUrl = process.env['DATABASE_URL'];
if (!databaseUrl) {
  console.error('DATABASE_URL is missing: the address of the database with the server’s role.');
  process.exit(1);
}
const NAMES = {
  worksheet: 'worksheet attempts',
  practice: 'practice attempts',
  sitting: 'sittings',
} as const;

function sayDifference({ kind, id, question, what, stored, again }: Difference): void {
  const where = [kind, id, question].filter((part) => part !== null).join(' ');
  console.log(`${where}: ${what} stored ${stored}, again ${again}`);
}

function sayProgress({ kind, done, outOf }: Progress): void {
  console.error(`  ${NAMES[kind]}: ${done} of ${outOf}`);
}

let differences = 0;
const { remarking, close } = openRemarking(databaseUrl);
try {
  const attempts = await remarking.remarkAll({
    onProgress: sayProgress,
    onDifference: (difference) => {
      differences += 1;
      sayDifference(difference);
    },
  });
  const found = differences === 1 ? '1 difference' : `${differences || 'no'} differences`;
  console.log(`Marked ${attempts} attempts again: ${found}.`);
} finally {
  await close();
}
if (differences > 0) process.exitCode = 1;

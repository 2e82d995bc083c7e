import { readFileSync } from 'node:fs';
import { auditQuestion, breachesOf, parseQuestion } from '@ferrule/assessments';
import { fromRoot } from '../steps/paths.mjs';

/** Processor time of this process: other programs must not make a question look slow. */
function clock() {
  const { user, system } = process.cpuUsage();
  return (user + system) / 1000;
}

function auditSheet({ path, draws }) {
  const question = parseQuestion(readFileSync(fromRoot(path), 'utf8'), path);
  const audit = auditQuestion(question, { draws, clock });
  return { audit, breaches: breachesOf(audit) };
}

process.on('message', (job) => {
  try {
    process.send(auditSheet(job));
  } catch (error) {
    process.send({ failure: error.name === 'SheetInvalid' ? error.message : error.stack });
  }
});
process.on('disconnect', () => process.exit());

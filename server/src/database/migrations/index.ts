import { createAccounts } from './20261201T0900-create-accounts.ts';
import { createMail } from './20261201T0910-create-mail.ts';
import { createContent } from './20261201T0920-create-content.ts';
import { createClasses } from './20261201T0930-create-classes.ts';
import { createWorksheets } from './20261201T0940-create-worksheets.ts';
import { createSittings } from './20261201T0950-create-sittings.ts';
import { createCertificates } from './20261201T1000-create-certificates.ts';
import { endCertificatesOnce } from './20261201T1010-end-certificates-once.ts';
import { fadePractice } from './20261201T1700-fade-practice.ts';
import { choosePracticeProfile } from './20261201T1710-choose-practice-profile.ts';
import { publishGlossaries } from './20261201T1740-publish-glossaries.ts';
import { searchContent } from './20261201T1750-search-content.ts';
import { askRecall } from './20261201T1840-ask-recall.ts';

/** One step of the schema's history. Never edited once it has landed. */
export interface Migration {
  readonly name: string;
  readonly sql: string;
}

export const migrations: readonly Migration[] = [
  createAccounts,
  createMail,
  createContent,
  createClasses,
  createWorksheets,
  createSittings,
  createCertificates,
  endCertificatesOnce,
  fadePractice,
  choosePracticeProfile,
  publishGlossaries,
  searchContent,
  askRecall,
];

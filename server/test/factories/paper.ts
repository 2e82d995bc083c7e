import { parseBlueprint, parseQuestion } from '@ferrule/assessments';
import { createHash } from 'node:crypto';
import pg from 'pg';
import type { TestApp } from '../test-app.ts';

/** Words and figures that stand in the question sheets and may never reach a candidate. */
export const CANARIES = [
  'canaryhidden',
  'canarystep',
  'canaryslip',
  'canarysay',
  'canarycredit',
  'canarybecause',
  'canaryreason',
  'canaryoption',
  '1.0937',
];

interface SheetOptions {
  readonly id: string;
  readonly revision?: string;
  readonly title?: string;
  readonly subject?: string;
  readonly lesson?: string;
}

/** A small question with something planted in everything that must stay behind. */
export function questionSheet(options: SheetOptions): string {
  const {
    id,
    revision = 'A',
    title = 'Drop on one core',
    subject = 'VD',
    lesson = '3.4',
  } = options;
  return `---
id: ${id}
title: ${title}
revision: ${revision}
subject: ${subject}
level: apply
pool: paper
lesson: "${lesson}"
profile: metric
language: en
author: Odile Marchetti
checked by: Ruaridh Nakamura
sources: ["Ohm's law: definition"]
aids: [Calculator]
given:
  current: { is: Load, symbol: I, from: 3.5 A, to: 19.5 A, step: 0.5 A }
  resistance: { is: Resistance of the core, symbol: R, one of: [17 mΩ, 23 mΩ, 41 mΩ] }
  canaryhidden: { is: canaryhidden factor, value: 1.0937, shown: false }
steps:
  canarystep: { symbol: U_d, unit: V, is: current * resistance * canaryhidden }
  fuller: { symbol: U_f, unit: V, is: canarystep * 2 }
ask:
  a: { find: canarystep, units: [V, mV], within: 15 %, marks: 2 }
  b: { find: fuller, units: [V], within: 15 %, marks: 3, carry: never, because: canarybecause is why }
  c:
    choose:
      - is: Thicker cable
        right: true
      - is: Thinner cable
        say: canaryoption is wrong
      - is: Longer cable
        say: canaryoption is wrong too
    marks: 1
slips:
  - is: You did the canaryslip.
    say: canarysay is what it does
    credit: canarycredit was right
    makes: { canarystep: current * resistance / 2 }
---

A lamp on one core.

## a

Find the drop.

## b

Find the drop there and back.

## c

What makes it less?
`;
}

interface BlueprintOptions {
  readonly revision?: string;
  readonly minutes?: number;
  readonly passMark?: number;
  readonly agreement?: string;
}

export const PAPER = 'try-paper';

export function blueprintSheet(options: BlueprintOptions = {}): string {
  const { revision = 'A', minutes = 45, passMark = 70, agreement = 'I work alone.' } = options;
  return `---
id: ${PAPER}
number: F1
title: Final paper
revision: ${revision}
course: hq-dc2
language: en
minutes: ${minutes}
pass mark: ${passMark}
wait days: 14
sat: unsupervised, on the candidate's own device
questions: [{ subject: VD, count: 2 }, { subject: RD, count: 1 }]
aids: [Calculator, Cable table]
scheme:
  id: dc-installer
  revision: A
  title: Auxiliary DC systems installer
  scope: [Sizes two-wire runs]
  limits: [Nothing above 50 V]
  valid years: 3
  zone: Europe/London
appeal: Write to the school within ten working days.
---

${agreement}
`;
}

async function asOwner(test: TestApp, work: (client: pg.Client) => Promise<void>): Promise<void> {
  const client = new pg.Client({ connectionString: test.database.ownerUrl });
  await client.connect();
  try {
    await work(client);
  } finally {
    await client.end();
  }
}

interface Revision {
  readonly kind: 'course' | 'lesson' | 'question' | 'blueprint';
  readonly slug: string;
  readonly revision: string;
  readonly source: string;
  readonly compiled: object;
  readonly subject: string | null;
}

async function add(client: pg.Client, sheet: Revision): Promise<void> {
  const { kind, slug, revision, source, compiled, subject } = sheet;
  await client.query(
    `UPDATE content_revisions SET state = 'superseded' WHERE kind = $1 AND slug = $2 AND state = 'current'`,
    [kind, slug],
  );
  await client.query(
    `INSERT INTO content_revisions (kind, slug, revision, source, hash, format_version, compiled, pool, subject)
     VALUES ($1, $2, $3, $4, $5, 1, $6, $7, $8)`,
    [
      ...[kind, slug, revision, source, createHash('sha256').update(source).digest()],
      ...[JSON.stringify(compiled), kind === 'question' ? 'paper' : null, subject],
    ],
  );
}

/** Publishes a question sheet, as the publisher does with the owner's role. */
export async function publishQuestion(test: TestApp, source: string): Promise<void> {
  const compiled = parseQuestion(source, 'test.md');
  const { slug, revision, subject } = compiled.meta;
  await asOwner(test, (client) =>
    add(client, { kind: 'question', slug, revision, source, compiled, subject }),
  );
}

/** Publishes a blueprint and the scheme it leads to. */
export async function publishBlueprint(test: TestApp, source: string): Promise<void> {
  const compiled = parseBlueprint(source, 'test.md');
  const { slug, revision, scheme } = compiled;
  await asOwner(test, async (client) => {
    await add(client, { kind: 'blueprint', slug, revision, source, compiled, subject: null });
    await client.query(
      `INSERT INTO schemes (slug, revision, title, scope, limits, valid_years, zone)
       VALUES ($1, $2, $3, $4, $5, $6, $7) ON CONFLICT DO NOTHING`,
      [
        ...[scheme.slug, scheme.revision, scheme.title, JSON.stringify(scheme.scope)],
        ...[JSON.stringify(scheme.limits), scheme.validYears, scheme.zone],
      ],
    );
  });
}

/** A paper of three questions out of a pool of five. */
export async function publishPaper(test: TestApp): Promise<void> {
  for (const id of ['vd-one', 'vd-two', 'vd-three']) {
    await publishQuestion(test, questionSheet({ id }));
  }
  for (const id of ['rd-one', 'rd-two']) {
    await publishQuestion(test, questionSheet({ id, subject: 'RD', lesson: '4.1' }));
  }
  await publishBlueprint(test, blueprintSheet());
}

/** A course with one sheet and its worksheet, as far as a result points to them. */
export async function publishCourse(test: TestApp): Promise<void> {
  const lesson = { number: '3.4', title: 'The long run' };
  const unit = { number: 3, title: 'Voltage drop', sheets: ['3.4'], worksheet: { number: 'W3' } };
  const shared = { revision: 'A', source: '', subject: null };
  await asOwner(test, async (client) => {
    await add(client, { ...shared, kind: 'lesson', slug: 'the-long-run', compiled: lesson });
    await add(client, { ...shared, kind: 'course', slug: 'hq-dc2', compiled: { units: [unit] } });
  });
}

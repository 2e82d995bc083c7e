import { z } from 'zod';
import { openSheet } from '../sheets/sheet-file.ts';
import { SheetInvalid } from '../sheets/errors.ts';
import { SUBJECTS } from '../subjects.ts';
import { type Blueprint } from './types.ts';

const FORMAT_VERSION = 1;
const line = z.string().trim().min(1).max(200);
const zone = line.refine(isZone, 'a time zone is named like Europe/London');

const schema = z.strictObject({
  id: z.string().regex(/^[a-z][a-z0-9-]{2,40}$/, 'an id is like final-paper'),
  number: z.string().regex(/^[A-Z]\d{1,2}$/, 'a paper number is like F1'),
  title: line,
  revision: z.string().regex(/^[A-Z]$/, 'a revision is one capital letter'),
  course: z.string().regex(/^[a-z0-9-]{2,40}$/),
  language: z.string().regex(/^[a-z]{2}$/),
  minutes: z.int().min(5).max(360),
  'pass mark': z.number().min(1).max(100),
  'wait days': z.int().min(0).max(365),
  sat: line,
  questions: z
    .array(
      z.strictObject({
        subject: z.enum(Object.keys(SUBJECTS)),
        count: z.int().min(1).max(60),
      }),
    )
    .min(1)
    .refine(hasNoDouble, 'a subject is named once; add its counts up'),
  aids: z.array(line).default([]),
  scheme: z.strictObject({
    id: z.string().regex(/^[a-z][a-z0-9-]{2,60}$/),
    revision: z.string().regex(/^[A-Z]$/),
    title: line,
    scope: z.array(line).min(1).max(12),
    limits: z.array(line).min(1).max(12),
    'valid years': z.int().min(1).max(10),
    zone,
  }),
  appeal: z.string().trim().min(1).max(1000),
});

function hasNoDouble(questions: { subject: string }[]): boolean {
  return new Set(questions.map(({ subject }) => subject)).size === questions.length;
}

function isZone(name: string): boolean {
  try {
    return new Intl.DateTimeFormat('en', { timeZone: name }).resolvedOptions().timeZone !== '';
  } catch {
    return false;
  }
}

/**
 * Reads a paper's blueprint; the text below the front matter is what a candidate agrees to.
 *
 * @throws {SheetInvalid} naming the file and the line of everything that is wrong.
 */
export function parseBlueprint(source: string, path: string): Blueprint {
  const { front, intro, sections } = openSheet(source, path, schema);
  const agreement = [intro, ...sections.map((s) => `## ${s.heading}\n\n${s.text}`)]
    .filter((text) => text !== '')
    .join('\n\n');
  if (agreement === '') {
    const message = 'The agreement is missing; write below the front matter what is agreed to.';
    throw new SheetInvalid(path, [{ line: 1, message }]);
  }
  const { scheme } = front;
  return {
    formatVersion: FORMAT_VERSION,
    slug: front.id,
    number: front.number,
    title: front.title,
    revision: front.revision,
    course: front.course,
    minutes: front.minutes,
    passPercent: front['pass mark'],
    waitDays: front['wait days'],
    sat: front.sat,
    questions: front.questions,
    aids: front.aids,
    agreement,
    scheme: {
      slug: scheme.id,
      revision: scheme.revision,
      title: scheme.title,
      scope: scheme.scope,
      limits: scheme.limits,
      validYears: scheme['valid years'],
      zone: scheme.zone,
    },
    appeal: front.appeal,
    language: front.language,
  };
}

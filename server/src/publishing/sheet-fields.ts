import { SUBJECTS } from '@ferrule/assessments';
import { z } from 'zod';

/** Pieces of front matter that courses and lessons share. */
export const line = (most: number) =>
  z
    .string({ error: 'write this in words' })
    .trim()
    .min(1, 'must not be empty')
    .max(most, `at most ${most} characters`);

export const revision = z
  .string({ error: 'a revision letter' })
  .regex(/^[A-Z]{1,2}$/, 'a revision letter, such as B');

export const slug = z
  .string({ error: 'a short name' })
  .regex(/^[a-z0-9]+(-[a-z0-9]+)*$/, 'a short name of small letters, digits and hyphens');

export const day = z.iso.date({ error: 'a date such as 2026-11-02' });

export const language = z
  .string()
  .regex(/^[a-z]{2,3}(-[A-Za-z0-9]{2,8})*$/, 'a language tag, such as en');

export const lessonNumber = z
  .string({ error: 'a number in quotes, such as "3.4"' })
  .regex(/^\d{1,2}\.\d{1,2}$/, 'a number such as "3.4"');

export const subject = z
  .string()
  .refine((code) => code in SUBJECTS, `one of ${Object.keys(SUBJECTS).join(', ')}`);

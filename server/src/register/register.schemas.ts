import { z } from 'zod';

const instant = z.iso.datetime();
const day = z.iso.date();

export const checkSchema = z.strictObject({
  number: z.string().max(200),
  familyName: z.string().max(200),
});
export type Check = z.infer<typeof checkSchema>;

export const linkCodeSchema = z.string().max(100);
export const sha256Schema = z
  .string()
  .regex(/^[0-9a-f]{64}$/i, 'A SHA-256 is written with 64 hexadecimal digits.');

/** What the register says of a certificate: what is printed on it and how it stands, no more. */
export const registerAnswerSchema = z.strictObject({
  answer: z.enum(['valid', 'expired', 'withdrawn', 'superseded', 'not-on-register']),
  /** To the minute. */
  checkedAt: instant,
  certificate: z
    .strictObject({
      number: z.string(),
      /** Null when the certificate was withdrawn. */
      holderName: z.string().nullable(),
      scheme: z.strictObject({ title: z.string(), revision: z.string() }),
      scope: z.array(z.string()),
      limits: z.array(z.string()),
      howSat: z.string(),
      issuedOn: day,
      expiresOn: day,
      withdrawnOn: day.nullable(),
    })
    .nullable(),
});
export type RegisterAnswer = z.infer<typeof registerAnswerSchema>;

export const fileRecordSchema = registerAnswerSchema.extend({
  /** When the register had the file signed: the time its signature is checked at. */
  signedAt: instant.nullable(),
});
export type FileRecord = z.infer<typeof fileRecordSchema>;

export const issuersSchema = z.strictObject({
  issuers: z.array(
    z.strictObject({
      keyId: z.string(),
      kind: z.enum(['root', 'leaf']),
      pem: z.string(),
      validFrom: instant,
      validTo: instant,
    }),
  ),
});
export type Issuers = z.infer<typeof issuersSchema>;

export const fileAnswerSchema = z.strictObject({
  /** Whether it is the very file that was issued, or what is wrong with it. */
  file: z.enum([
    'the-very-file',
    'not-on-register',
    'not-a-pdf',
    'not-signed',
    'changed-after-signing',
    'added-to',
    'wrong-issuer',
    'unknown-key',
    'malformed-signature',
    'expired-key-at-issue',
    'too-large',
  ]),
  detail: z.string(),
  /** The number the file claims, whatever else is wrong with it. */
  number: z.string().nullable(),
  /** Of the very file's certificate; a file that is not ours says nothing about anybody. */
  register: registerAnswerSchema,
});
export type FileAnswer = z.infer<typeof fileAnswerSchema>;

import { z } from 'zod';
import { STATES } from './certificate.ts';

const instant = z.iso.datetime();
const day = z.iso.date();

export const certificateIdSchema = z.uuid();

export const certificateViewSchema = z.strictObject({
  id: z.uuid(),
  number: z.string(),
  holderName: z.string(),
  scheme: z.strictObject({ title: z.string(), revision: z.string() }),
  scope: z.array(z.string()),
  limits: z.array(z.string()),
  howSat: z.string(),
  issuedOn: day,
  expiresOn: day,
  state: z.enum(STATES),
  /** Whether the PDF has been drawn and signed. */
  ready: z.boolean(),
  registerUrl: z.string(),
  /** The number of the certificate that took its place. */
  replacedBy: z.string().nullable(),
  withdrawn: z.strictObject({ on: day, reason: z.string() }).nullable(),
  history: z.array(z.strictObject({ at: instant, what: z.string(), by: z.string() })),
});
export type CertificateView = z.infer<typeof certificateViewSchema>;

export const ownCertificatesSchema = z.strictObject({
  certificates: z.array(certificateViewSchema),
});
export type OwnCertificates = z.infer<typeof ownCertificatesSchema>;

export const findCertificatesSchema = z.strictObject({
  find: z.string().trim().max(100).default(''),
  cursor: z.string().max(300).default(''),
});
export type FindCertificates = z.infer<typeof findCertificatesSchema>;

export const certificatesPageSchema = z.strictObject({
  certificates: z.array(certificateViewSchema),
  nextCursor: z.string().nullable(),
});
export type CertificatesPage = z.infer<typeof certificatesPageSchema>;

/** One paragraph of text: it goes into a mail. */
const reason = z
  .string()
  .trim()
  .min(1, 'Say why. The history keeps it.')
  .max(500)
  .regex(/^[^\p{Cc}\p{Surrogate}]*$/u, 'Write the reason on one line.');

export const withdrawSchema = z.strictObject({ reason });
export type Withdraw = z.infer<typeof withdrawSchema>;

const name = z
  .string()
  .trim()
  .max(100)
  .regex(/^[^\p{Cc}\p{Surrogate}]*$/u, 'Use letters, spaces and signs of a name only.')
  .normalize('NFC');

export const correctNameSchema = z.strictObject({
  givenName: name.min(1, 'Type the name as it should stand.'),
  familyName: name,
  reason,
});
export type CorrectName = z.infer<typeof correctNameSchema>;

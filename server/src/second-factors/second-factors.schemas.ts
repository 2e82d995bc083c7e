import { z } from 'zod';

export const enrolmentSchema = z.strictObject({
  secret: z.string(),
  otpauthUri: z.string(),
  qrSvg: z.string(),
});
export type Enrolment = z.infer<typeof enrolmentSchema>;

export const confirmEnrolmentSchema = z.strictObject({
  code: z
    .string()
    .trim()
    .regex(/^\d{6}$/, 'Give the six figures the app shows.'),
});
export type ConfirmEnrolment = z.infer<typeof confirmEnrolmentSchema>;

export const recoveryCodesSchema = z.strictObject({ recoveryCodes: z.array(z.string()) });
export type RecoveryCodes = z.infer<typeof recoveryCodesSchema>;

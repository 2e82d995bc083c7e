import { z } from 'zod';

const MAX_PASSWORD_CHARACTERS = 256;

/** What a person types as a passphrase they already have. */
const currentPasswordSchema = z.string().min(1).max(1_024);

/** A passphrase being chosen; whether it is good enough is judged with the person's name at hand. */
const newPasswordSchema = z
  .string()
  .min(1)
  .max(1_024)
  .refine((text) => [...text].length <= MAX_PASSWORD_CHARACTERS, {
    message: `Use at most ${MAX_PASSWORD_CHARACTERS} characters.`,
  });

/** One line of text: no control characters, nothing that could start a header or a second line. */
const nameSchema = z
  .string()
  .trim()
  .max(100)
  .regex(/^[^\p{Cc}\p{Zl}\p{Zp}<>]*$/u, 'Use letters, spaces and signs of a name only.')
  .normalize('NFC');
const givenNameSchema = nameSchema.min(1, 'Give a name.');
const familyNameSchema = nameSchema;

/** As certificates print it. */
const schoolLineSchema = z
  .string()
  .trim()
  .max(200)
  .regex(/^[^\p{Cc}\p{Zl}\p{Zp}<>]*$/u, 'Use one line of letters, digits and signs.')
  .normalize('NFC');

const emailSchema = z.string().trim().max(254).toLowerCase().pipe(z.email());
const tokenSchema = z.string().min(1).max(200);

export const acceptedSchema = z.strictObject({});
export type Accepted = z.infer<typeof acceptedSchema>;

export const signUpSchema = z.strictObject({
  givenName: givenNameSchema,
  familyName: familyNameSchema,
  email: emailSchema,
  password: newPasswordSchema,
});
export type SignUp = z.infer<typeof signUpSchema>;

export const checkPasswordSchema = z.strictObject({ password: z.string().max(1_024) });
export type CheckPassword = z.infer<typeof checkPasswordSchema>;

export const passwordJudgementSchema = z.strictObject({
  lengthShort: z.number().int().min(0),
  common: z.boolean(),
  reason: z.string().nullable(),
});

export const useTokenSchema = z.strictObject({ token: tokenSchema });
export type UseToken = z.infer<typeof useTokenSchema>;

export const addressSchema = z.strictObject({ email: emailSchema });
export type Address = z.infer<typeof addressSchema>;

export const changePasswordSchema = z.strictObject({
  currentPassword: currentPasswordSchema,
  newPassword: newPasswordSchema,
  endOtherSessions: z.boolean(),
});
export type ChangePassword = z.infer<typeof changePasswordSchema>;

export const resetPasswordSchema = z.strictObject({
  token: tokenSchema,
  password: newPasswordSchema,
});
export type ResetPassword = z.infer<typeof resetPasswordSchema>;

export const changeEmailSchema = z.strictObject({
  email: emailSchema,
  password: currentPasswordSchema,
});
export type ChangeEmail = z.infer<typeof changeEmailSchema>;

export const addressNowSchema = z.strictObject({ email: z.string() });
export type AddressNow = z.infer<typeof addressNowSchema>;

export const claimAdministratorSchema = signUpSchema.extend({
  token: tokenSchema,
  schoolName: schoolLineSchema.min(1, 'Give the school’s name.'),
  schoolAddress: schoolLineSchema.min(1, 'Give the school’s address, in one line.'),
});
export type ClaimAdministrator = z.infer<typeof claimAdministratorSchema>;

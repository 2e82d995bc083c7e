import { z } from 'zod';
import { PRACTICE_PROFILES } from './practice-profile.ts';

export const practiceProfileSchema = z.strictObject({ profile: z.enum(PRACTICE_PROFILES) });
export type PracticeProfileView = z.infer<typeof practiceProfileSchema>;

export const PRACTICE_PROFILES = ['metric', 'awg'] as const;

/** Whose sizes, limits and factors a school works by. No claim that any of them is law anywhere. */
export type PracticeProfile = (typeof PRACTICE_PROFILES)[number];

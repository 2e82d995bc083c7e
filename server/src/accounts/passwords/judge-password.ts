export interface PasswordJudgement {
  readonly lengthShort: number;
  readonly common: boolean;
  readonly reason: string | null;
}
export function judgePassword(password: string): PasswordJudgement {
  return { lengthShort: Math.max(0, 15 - [...password].length), common: false, reason: null };
}

/** What happened, in the words of the people page. */
export interface HappenedEvent {
  readonly kind: string;
  /** Who did it, when it was somebody else. */
  readonly actorName: string | null;
  readonly detail: Readonly<Record<string, string | number | boolean>>;
}

const words: Readonly<Record<string, string>> = {
  'access-denied': 'asked for something not allowed',
  'account-opened': 'opened the account',
  'administrator-claimed': 'became the first administrator',
  'email-change-asked': 'asked for another email',
  'email-change-undone': 'took a change of email back',
  'email-changed': 'changed the email',
  'email-confirmed': 'confirmed the email',
  'other-sessions-ended': 'ended the other sessions',
  'password-changed': 'changed the passphrase',
  'password-confirmed': 'gave the passphrase once more',
  'password-refused': 'gave a wrong passphrase while signed in',
  'password-reset': 'chose a new passphrase by mail',
  'password-reset-started': 'was sent a link for a new passphrase',
  'practice-profile-chosen': 'chose the practice profile of the school',
  'recovery-code-used': 'used a recovery code',
  reinstated: 'was reinstated',
  'role-given': 'was made',
  'role-taken': 'is no longer',
  'second-factor-enrolled': 'set up the second factor',
  'second-factor-given': 'gave the second factor',
  'second-factor-refused': 'gave a wrong code',
  'session-ended': 'ended a session',
  'sessions-ended': 'was signed out everywhere',
  'sign-in': 'signed in',
  'sign-in-held-back': 'too many tries to sign in',
  'sign-in-refused': 'a sign-in was refused',
  'sign-out': 'signed out',
  suspended: 'was suspended',
};

const isTold = (fact: unknown): fact is string => typeof fact === 'string' && fact !== '';

/** One line: what happened, by whom where it was another, and why where that was given. */
export function tellEvent({ kind, actorName, detail }: HappenedEvent): string {
  const what = words[kind] ?? kind.replaceAll('-', ' ');
  const role = isTold(detail['role']) ? ` ${detail['role'].replace('-', ' ')}` : '';
  const by = actorName === null ? '' : ` by ${actorName}`;
  const reason = detail['reason'] ?? detail['why'];
  return `${what}${role}${by}${isTold(reason) ? `: ${reason}` : ''}`;
}

/** Every letter the server writes. The words of each are in `templates/`. */
export const TEMPLATE_NAMES = [
  'already-registered',
  'certificate-corrected',
  'certificate-issued',
  'certificate-withdrawn',
  'confirm-email',
  'email-change-confirm',
  'email-change-notice',
  'password-changed',
  'reset-password',
  'result-not-passed',
  'result-passed',
] as const;
export type TemplateName = (typeof TEMPLATE_NAMES)[number];

/** A mail to be written: which letter, to whom, and the values it speaks of. */
export interface Letter {
  readonly template: TemplateName;
  readonly to: { readonly name: string; readonly email: string };
  readonly accountId: string | null;
  /** The same key never makes a second mail. */
  readonly dedupeKey: string;
  readonly values: Readonly<Record<string, string>>;
  readonly attachCertificateId?: string;
}

/**
 * The words of a letter. Each string is a Liquid template over the letter's values, and one
 * that comes out empty is left out. The subject and the preview are read by others on a locked
 * telephone: no scores, names or other personal facts in them.
 */
export interface LetterTemplate {
  /** The values it needs; a letter without one of them is refused. */
  readonly needs: readonly string[];
  readonly subject: string;
  readonly preview: string;
  readonly kicker: string;
  readonly heading: string;
  readonly tone: 'plain' | 'good';
  readonly facts: ReadonlyArray<readonly [label: string, value: string]>;
  readonly before: readonly string[];
  readonly button: { readonly label: string; readonly url: string };
  /** Title of a table, the value that holds its lines as `label<tab>value`, and its last line. */
  readonly table?: {
    readonly title: string;
    readonly lines: string;
    readonly total: readonly [label: string, value: string];
  };
  readonly after: readonly string[];
  readonly reason: string;
  /** The text opens something: it is not kept once the mail has left. */
  readonly holdsKey: boolean;
}

/** A letter with its values put in, ready to be laid out as text and as HTML. */
export interface WrittenLetter {
  readonly subject: string;
  readonly preview: string;
  readonly kicker: string;
  readonly heading: string;
  readonly tone: 'plain' | 'good';
  readonly facts: ReadonlyArray<readonly [label: string, value: string]>;
  readonly before: readonly string[];
  readonly button: { readonly label: string; readonly url: string };
  readonly table: {
    readonly title: string;
    readonly rows: ReadonlyArray<readonly [label: string, value: string]>;
    readonly total: readonly [label: string, value: string];
  } | null;
  readonly after: readonly string[];
  readonly reason: string;
  readonly school: string;
}

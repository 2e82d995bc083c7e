import { sayNumber, upperFirst } from './words.ts';

const divisions = 15;

/** "11 of 15. Four more to go." */
export function sayLength(length: number): string {
  if (length >= divisions) return `${length} characters: long enough.`;
  return `${length} of ${divisions}. ${upperFirst(sayNumber(divisions - length))} more to go.`;
}

interface PassRuleProps {
  length: number;
  id: string;
  /** Why a long enough one is refused all the same. */
  refusal?: string | null | undefined;
}

/** A rule of fifteen divisions under a new passphrase. */
export function PassRule({ length, id, refusal }: PassRuleProps) {
  const state = length >= divisions && !refusal ? 'long-enough' : '';
  return (
    <div className="pass-rule-block">
      <div className={`pass-rule ${state}`} aria-hidden="true">
        {Array.from({ length: divisions }, (_, index) => (
          <i key={index} className={index < length ? 'filled' : undefined} />
        ))}
      </div>
      <p id={id} className={`pass-rule-said ${state}`} aria-live={refusal ? 'polite' : 'off'}>
        {refusal ?? sayLength(length)}
      </p>
    </div>
  );
}

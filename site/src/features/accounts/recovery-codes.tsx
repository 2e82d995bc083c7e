import { Button } from '@radix-ui/themes';
import { useState } from 'react';
import { TickBox } from '../../ui/choice-row.tsx';

interface RecoveryCodesProps {
  codes: string[];
  onKept: () => void;
}

/** Shown once. Each opens the door once when the phone is not to hand. */
export function RecoveryCodes({ codes, onKept }: RecoveryCodesProps) {
  const [isKept, setIsKept] = useState(false);
  const [isCopied, setIsCopied] = useState(false);
  const copy = () =>
    void navigator.clipboard.writeText(codes.join('\n')).then(() => setIsCopied(true));
  return (
    <div role="status">
      <h2>Keep these recovery codes</h2>
      <p>
        Each works once, without the phone. They are shown now and never again: print them, write
        them down or put them in a password manager.
      </p>
      <ol className="recovery-codes mono">
        {codes.map((code) => (
          <li key={code}>{code}</li>
        ))}
      </ol>
      <p className="not-printed">
        <button type="button" className="text-button" onClick={copy}>
          {isCopied ? 'Copied' : 'Copy them all'}
        </button>{' '}
        <button type="button" className="text-button" onClick={() => window.print()}>
          Print this page
        </button>
      </p>
      <TickBox label="I have kept them" checked={isKept} onChange={setIsKept} />
      <div className="actions">
        <Button size="3" disabled={!isKept} onClick={onKept}>
          Carry on
        </Button>
      </div>
    </div>
  );
}

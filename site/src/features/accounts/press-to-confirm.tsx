import { Button } from '@radix-ui/themes';
import { useMutation } from '@tanstack/react-query';
import { type ReactNode } from 'react';
import { ProblemCallout } from '../../ui/problem-callout.tsx';
import { useLinkToken } from './use-link-token.ts';

interface PressToConfirmProps {
  label: string;
  busyLabel: string;
  send: (token: string) => Promise<{ email: string }>;
  done: (email: string) => ReactNode;
  /** Where a link that no longer works can be had anew. */
  otherwise: ReactNode;
}

/** Opening a mailed link uses nothing up: mail scanners open links too. Pressing the button does. */
export function PressToConfirm({ label, busyLabel, send, done, otherwise }: PressToConfirmProps) {
  const token = useLinkToken();
  const confirm = useMutation({ mutationFn: () => send(token) });
  if (confirm.isSuccess) return <div role="status">{done(confirm.data.email)}</div>;
  if (!token) {
    return (
      <>
        <p>
          <b>The link is not whole.</b> Copy all of it from the mail, up to its last character.
        </p>
        <p>{otherwise}</p>
      </>
    );
  }
  return (
    <>
      <ProblemCallout error={confirm.error} actions={otherwise} />
      <Button size="3" disabled={confirm.isPending} onClick={() => confirm.mutate()}>
        {confirm.isPending ? busyLabel : label}
      </Button>
    </>
  );
}

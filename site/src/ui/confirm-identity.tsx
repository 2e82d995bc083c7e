import { Button } from '@radix-ui/themes';
import { useMutation } from '@tanstack/react-query';
import { answerOf, api } from '../api/client.ts';
import { Form } from './form.tsx';
import { PassphraseField } from './form-field.tsx';

interface ConfirmIdentityProps {
  /** Runs once the passphrase has been accepted. */
  onConfirmed: () => void;
}

/** Asked when the last sign-in is too long ago for an act that cannot be undone. */
export function ConfirmIdentity({ onConfirmed }: ConfirmIdentityProps) {
  const confirm = useMutation({
    mutationFn: (password: string) =>
      answerOf(api.POST('/api/session/confirmation', { body: { password } })),
    onSuccess: onConfirmed,
  });
  return (
    <Form
      label="Confirm that it is you"
      problem={confirm.error}
      onSubmit={({ password = '' }) => confirm.mutate(password)}
    >
      <p>
        <b>Confirm that it is you.</b> You gave your passphrase a while ago, and this step asks for
        it again.
      </p>
      <PassphraseField name="password" label="Your passphrase" />
      <Button type="submit" size="3" disabled={confirm.isPending}>
        {confirm.isPending ? 'Confirming' : 'Confirm and carry on'}
      </Button>
    </Form>
  );
}

import { Button } from '@radix-ui/themes';
import { useMutation } from '@tanstack/react-query';
import { answerOf, api } from '../../api/client.ts';
import { Form } from '../../ui/form.tsx';
import { FormField, PassphraseField } from '../../ui/form-field.tsx';
import { Strip } from '../../ui/strip.tsx';

export function ChangeEmail({ email }: { email: string }) {
  const ask = useMutation({
    mutationFn: (body: { email: string; password: string }) =>
      answerOf(api.POST('/api/me/email-changes', { body })),
  });
  return (
    <Form
      label="Change email"
      problem={ask.error}
      onSubmit={({ email: typed = '', password = '' }) => ask.mutate({ email: typed, password })}
    >
      <p className="fine">
        Now <b>{email}</b>. A link goes to the new address; until it is opened nothing changes.
      </p>
      <FormField
        name="email"
        label="New email"
        type="email"
        autoComplete="email"
        required
        missing="Type the new address."
      />
      <PassphraseField name="password" label="Passphrase" />
      <div className="actions">
        <Button type="submit" size="3" variant="outline" disabled={ask.isPending}>
          {ask.isPending ? 'Sending' : 'Send the link'}
        </Button>
      </div>
      {ask.isSuccess && (
        <Strip kind="said">
          <b>A link is on its way to the new address.</b> The old one is told as well.
        </Strip>
      )}
    </Form>
  );
}

import { Button } from '@radix-ui/themes';
import { useMutation } from '@tanstack/react-query';
import { answerOf, api } from '../../api/client.ts';
import { Form } from '../../ui/form.tsx';
import { FormField } from '../../ui/form-field.tsx';
import { Strip } from '../../ui/strip.tsx';

/** Sends the confirmation link once more; the answer is the same for every address. */
export function SendLinkAgain({ email }: { email?: string | undefined }) {
  const send = useMutation({
    mutationFn: (body: { email: string }) =>
      answerOf(api.POST('/api/email-confirmations/again', { body })),
  });
  return (
    <Form
      label="Send the link again"
      problem={send.error}
      onSubmit={({ email: typed = '' }) => send.mutate({ email: typed })}
    >
      <FormField
        name="email"
        label="Email"
        type="email"
        autoComplete="email"
        required
        missing="Type the address you signed up with."
        {...(email && { defaultValue: email })}
      />
      <Button type="submit" size="3" variant="outline" disabled={send.isPending}>
        {send.isPending ? 'Sending' : 'Send it again'}
      </Button>
      {send.isSuccess && (
        <Strip kind="said">
          <b>If that address waits for confirmation, a new link is on its way.</b> The old one stops
          working.
        </Strip>
      )}
    </Form>
  );
}

import '../features/accounts/accounts.css';
import { Button } from '@radix-ui/themes';
import { useMutation } from '@tanstack/react-query';
import { answerOf, api } from '../api/client.ts';
import { Form } from '../ui/form.tsx';
import { FormField } from '../ui/form-field.tsx';
import { PageTitle } from '../ui/page-title.tsx';
import { Sheet, SheetHead } from '../ui/sheet.tsx';
import { Strip } from '../ui/strip.tsx';

export function Component() {
  return (
    <Sheet width="narrow">
      <PageTitle>A new passphrase</PageTitle>
      <SheetHead
        kicker="Account"
        title="A new passphrase"
        standfirst="Two steps: a link by email, then the passphrase."
      />
      <div className="account-columns">
        <div>
          <p className="kicker">Step 1 of 2</p>
          <h2>Ask for a link</h2>
          <AskForLink />
        </div>
        <aside>
          <h2>No access to that email?</h2>
          <p>
            Ask the school in person, with your name and a certificate number if you have one. An
            administrator can start a reset; nobody can read a passphrase.
          </p>
        </aside>
      </div>
    </Sheet>
  );
}

function AskForLink() {
  const ask = useMutation({
    mutationFn: (body: { email: string }) => answerOf(api.POST('/api/password-resets', { body })),
  });
  return (
    <Form
      label="Ask for a link"
      problem={ask.error}
      onSubmit={({ email = '' }) => ask.mutate({ email })}
    >
      <FormField
        name="email"
        label="Email"
        type="email"
        autoComplete="username"
        required
        missing="Type the address of your account."
      />
      <Button type="submit" size="3" disabled={ask.isPending}>
        {ask.isPending ? 'Sending' : 'Send the link'}
      </Button>
      {ask.isSuccess && (
        <Strip kind="said">
          <b>If that address has an account, a link is on its way.</b> It works once. The answer is
          the same either way, so that nobody can find out who is registered.
        </Strip>
      )}
    </Form>
  );
}

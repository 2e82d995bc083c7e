import '../features/accounts/accounts.css';
import { Button } from '@radix-ui/themes';
import { useMutation } from '@tanstack/react-query';
import { Link } from 'react-router-dom';
import { answerOf, api } from '../api/client.ts';
import { NewPassphraseField } from '../features/accounts/new-passphrase-field.tsx';
import { PassphraseHints } from '../features/accounts/passphrase-hints.tsx';
import { useLinkToken } from '../features/accounts/use-link-token.ts';
import { Form } from '../ui/form.tsx';
import { PageTitle } from '../ui/page-title.tsx';
import { Sheet, SheetHead } from '../ui/sheet.tsx';
import { TickSign } from '../ui/symbols/signs.tsx';

export function Component() {
  return (
    <Sheet width="narrow">
      <PageTitle>Choose the new passphrase</PageTitle>
      <SheetHead
        kicker="Account, step 2 of 2"
        title="Choose it"
        standfirst="Every session of yours ends, and we mail you that it was changed."
      />
      <div className="account-columns">
        <div>
          <ChoosePassphrase />
        </div>
        <aside>
          <PassphraseHints />
        </aside>
      </div>
    </Sheet>
  );
}

function ChoosePassphrase() {
  const token = useLinkToken();
  const reset = useMutation({
    mutationFn: (password: string) =>
      answerOf(api.POST('/api/password-resets/confirmations', { body: { token, password } })),
  });
  if (reset.isSuccess) {
    return (
      <div role="status">
        <p>
          <TickSign className="passed" />
          <b>Changed.</b> Sign in with the new one.
        </p>
        <p className="actions">
          <Link to="/sign-in">Sign in</Link>
        </p>
      </div>
    );
  }
  if (!token) {
    return (
      <p>
        <b>The link is not whole.</b> Copy all of it from the mail, or{' '}
        <Link to="/reset">ask for a new one</Link>.
      </p>
    );
  }
  return (
    <Form
      label="Choose the new passphrase"
      problem={reset.error}
      onSubmit={({ password = '' }) => reset.mutate(password)}
    >
      <NewPassphraseField label="New passphrase" />
      <Button type="submit" size="3" disabled={reset.isPending}>
        {reset.isPending ? 'Changing' : 'Change passphrase'}
      </Button>
    </Form>
  );
}

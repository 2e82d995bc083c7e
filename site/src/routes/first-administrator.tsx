import '../features/accounts/accounts.css';
import { Button } from '@radix-ui/themes';
import { useMutation } from '@tanstack/react-query';
import { Link } from 'react-router-dom';
import { answerOf, api } from '../api/client.ts';
import { NameFields } from '../features/accounts/name-fields.tsx';
import { NewPassphraseField } from '../features/accounts/new-passphrase-field.tsx';
import { PassphraseHints } from '../features/accounts/passphrase-hints.tsx';
import { useLinkToken } from '../features/accounts/use-link-token.ts';
import { Form } from '../ui/form.tsx';
import { FormField } from '../ui/form-field.tsx';
import { PageTitle } from '../ui/page-title.tsx';
import { Sheet, SheetHead } from '../ui/sheet.tsx';
import { TickSign } from '../ui/symbols/signs.tsx';

export function Component() {
  return (
    <Sheet width="narrow">
      <PageTitle>The first administrator</PageTitle>
      <SheetHead
        kicker="Setting up"
        title="The first administrator"
        standfirst="The link printed at the first start works once. Whoever uses it looks after people and certificates, and gives others their roles."
      />
      <div className="account-columns">
        <div>
          <ClaimForm />
        </div>
        <aside>
          <PassphraseHints />
          <h2>Afterwards</h2>
          <p>
            Administrators need a second step at sign-in: have a phone with an authenticator app at
            hand.
          </p>
        </aside>
      </div>
    </Sheet>
  );
}

interface Claim {
  schoolName: string;
  schoolAddress: string;
  givenName: string;
  familyName: string;
  email: string;
  password: string;
}

function ClaimForm() {
  const token = useLinkToken();
  const claim = useMutation({
    mutationFn: (person: Claim) =>
      answerOf(api.POST('/api/administrator-claims', { body: { token, ...person } })),
  });
  if (claim.isSuccess) {
    return (
      <div role="status">
        <p>
          <TickSign className="passed" />
          <b>The account is open.</b> Sign in to set up the second step.
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
        <b>The link is not whole.</b> Copy all of it from where the server was started.
      </p>
    );
  }
  return (
    <Form
      label="The first administrator"
      problem={claim.error}
      onSubmit={({ givenName = '', familyName = '', email = '', password = '', ...school }) => {
        const { schoolName = '', schoolAddress = '' } = school;
        claim.mutate({ givenName, familyName, email, password, schoolName, schoolAddress });
      }}
    >
      <NameFields />
      <FormField
        name="email"
        label="Email"
        type="email"
        autoComplete="email"
        required
        missing="Type the address you will sign in with."
      />
      <NewPassphraseField />
      <FormField
        name="schoolName"
        label="Name of the school"
        autoComplete="organization"
        maxLength={200}
        hint="Certificates print it."
        required
        missing="Type the school’s name as certificates should print it."
      />
      <FormField
        name="schoolAddress"
        label="Address of the school"
        autoComplete="street-address"
        maxLength={200}
        hint="In one line."
        required
        missing="Type the school’s address, in one line."
      />
      <Button type="submit" size="3" disabled={claim.isPending}>
        {claim.isPending ? 'Opening the account' : 'Open the account'}
      </Button>
    </Form>
  );
}

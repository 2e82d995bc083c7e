import { Button } from '@radix-ui/themes';
import { useMutation } from '@tanstack/react-query';
import { useNavigate } from 'react-router-dom';
import { answerOf, api } from '../../api/client.ts';
import { Form } from '../../ui/form.tsx';
import { FormField } from '../../ui/form-field.tsx';
import { NameFields } from './name-fields.tsx';
import { NewPassphraseField } from './new-passphrase-field.tsx';

interface NewAccount {
  givenName: string;
  familyName: string;
  email: string;
  password: string;
}

export function SignUpForm() {
  const navigate = useNavigate();
  const signUp = useMutation({
    mutationFn: (body: NewAccount) => answerOf(api.POST('/api/accounts', { body })),
    onSuccess: (_, { email }) => navigate('/sign-up/sent', { state: { email } }),
  });
  return (
    <Form
      label="Open an account"
      problem={signUp.error}
      onSubmit={({ givenName = '', familyName = '', email = '', password = '' }) =>
        signUp.mutate({ givenName, familyName, email, password })
      }
    >
      <NameFields />
      <FormField
        name="email"
        label="Email"
        type="email"
        autoComplete="email"
        required
        maxLength={254}
        missing="Type the address the confirmation should go to."
      />
      <NewPassphraseField />
      <Button type="submit" size="3" disabled={signUp.isPending}>
        {signUp.isPending ? 'Opening the account' : 'Open account'}
      </Button>
    </Form>
  );
}

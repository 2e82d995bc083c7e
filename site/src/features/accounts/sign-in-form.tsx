import { Button } from '@radix-ui/themes';
import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useLocation, useNavigate } from 'react-router-dom';
import { answerOf, api } from '../../api/client.ts';
import { changeSession, homeOf, needsSecondStep, readNext } from '../../api/session.ts';
import { type SessionView } from '../../api/views.ts';
import { Form } from '../../ui/form.tsx';
import { FormField, PassphraseField } from '../../ui/form-field.tsx';

export function SignInForm() {
  const arrive = useArrival();
  const signIn = useMutation({
    mutationFn: (body: { email: string; password: string }) =>
      answerOf(api.POST('/api/sessions', { body })),
    onSuccess: arrive,
  });
  return (
    <Form
      label="Sign in"
      problem={signIn.error}
      onSubmit={({ email = '', password = '' }) => signIn.mutate({ email, password })}
    >
      <FormField
        name="email"
        label="Email"
        type="email"
        autoComplete="username"
        required
        missing="Type the email address of your account."
      />
      <PassphraseField name="password" label="Passphrase" />
      <Button type="submit" size="3" disabled={signIn.isPending}>
        {signIn.isPending ? 'Signing in' : 'Sign in'}
      </Button>
    </Form>
  );
}

/** Keeps the new session and goes where the person was heading. */
export function useArrival() {
  const queryClient = useQueryClient();
  const navigate = useNavigate();
  const { search } = useLocation();
  return (session: SessionView) => {
    changeSession(queryClient, session);
    const next = readNext(search);
    if (needsSecondStep(session)) return navigate(`/second-factor${search}`);
    return navigate(next ?? homeOf(session));
  };
}

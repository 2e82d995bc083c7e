import { useQuery } from '@tanstack/react-query';
import { useEffect, useState } from 'react';
import { answerOf, api } from '../../api/client.ts';
import { PassphraseField } from '../../ui/form-field.tsx';

const restMs = 500;
const longEnough = 15;

interface NewPassphraseFieldProps {
  name?: string;
  label?: string;
}

/** A new passphrase: its length against the rule, and whether it is a common one. */
export function NewPassphraseField({
  name = 'password',
  label = 'Passphrase',
}: NewPassphraseFieldProps) {
  const [typed, setTyped] = useState('');
  return (
    <PassphraseField
      name={name}
      label={label}
      isNew
      refusal={useRefusal(typed)}
      onValue={setTyped}
    />
  );
}

/** Asks the server once typing has rested; a check that gets no answer is left to the form. */
function useRefusal(typed: string): string | null | undefined {
  const rested = useRested(typed);
  const check = useQuery({
    queryKey: ['password-check', rested],
    queryFn: ({ signal }) =>
      answerOf(api.POST('/api/password-checks', { body: { password: rested }, signal })),
    enabled: [...rested].length >= longEnough,
    retry: false,
    gcTime: 0,
  });
  return rested === typed ? check.data?.reason : null;
}

function useRested(value: string): string {
  const [rested, setRested] = useState(value);
  useEffect(() => {
    const timer = setTimeout(() => setRested(value), restMs);
    return () => clearTimeout(timer);
  }, [value]);
  return rested;
}

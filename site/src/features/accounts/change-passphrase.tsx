import { Button } from '@radix-ui/themes';
import { useMutation } from '@tanstack/react-query';
import { useState } from 'react';
import { answerOf, api } from '../../api/client.ts';
import { TickBox } from '../../ui/choice-row.tsx';
import { Form } from '../../ui/form.tsx';
import { PassphraseField } from '../../ui/form-field.tsx';
import { Strip } from '../../ui/strip.tsx';
import { NewPassphraseField } from './new-passphrase-field.tsx';

interface Change {
  currentPassword: string;
  newPassword: string;
  endOtherSessions: boolean;
}

export function ChangePassphrase() {
  const [formKey, setFormKey] = useState(0);
  const change = useMutation({
    mutationFn: (body: Change) => answerOf(api.PUT('/api/me/password', { body })),
    // A new form, so that neither passphrase stays on the screen.
    onSuccess: () => setFormKey((key) => key + 1),
  });
  return (
    <Form
      key={formKey}
      label="Change passphrase"
      problem={change.error}
      onSubmit={({ currentPassword = '', newPassword = '', endOtherSessions }) =>
        change.mutate({ currentPassword, newPassword, endOtherSessions: endOtherSessions === 'on' })
      }
    >
      <PassphraseField name="currentPassword" label="Passphrase now" />
      <NewPassphraseField name="newPassword" label="New passphrase" />
      <TickBox name="endOtherSessions" label="End my other sessions" defaultChecked />
      <div className="actions">
        <Button type="submit" size="3" variant="outline" disabled={change.isPending}>
          {change.isPending ? 'Changing' : 'Change passphrase'}
        </Button>
      </div>
      {change.isSuccess && <Strip kind="said">Changed. We mailed you that it was.</Strip>}
    </Form>
  );
}

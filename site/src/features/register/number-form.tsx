import { Button } from '@radix-ui/themes';
import { useNavigate } from 'react-router-dom';
import { Form } from '../../ui/form.tsx';
import { FormField } from '../../ui/form-field.tsx';

export interface TypedCheck {
  number: string;
  familyName: string;
}

interface NumberFormProps {
  busy?: boolean;
  problem?: unknown;
  onCheck: (typed: TypedCheck) => void;
}

/** Number and family name: what a typed check asks for. */
export function NumberForm({ busy = false, problem, onCheck }: NumberFormProps) {
  return (
    <Form
      label="Check a certificate"
      className="number-form"
      problem={problem}
      onSubmit={({ number = '', familyName = '' }) => onCheck({ number, familyName })}
    >
      <FormField
        name="number"
        label="Certificate number"
        placeholder="HQ7K-2M4T-9XWD"
        autoCapitalize="characters"
        autoComplete="off"
        spellCheck={false}
        required
        maxLength={40}
        missing="Type the number printed on the certificate."
      />
      <FormField
        name="familyName"
        label="Holder’s family name"
        autoComplete="off"
        spellCheck={false}
        required
        maxLength={100}
        missing="Type the family name, or the only name, of the holder."
      />
      <Button type="submit" size="3" disabled={busy}>
        {busy ? 'Checking' : 'Check'}
      </Button>
    </Form>
  );
}

/** The same form away from the register: it carries what was typed over to it. */
export function CheckFromHere() {
  const navigate = useNavigate();
  return <NumberForm onCheck={(typed) => void navigate('/check', { state: typed })} />;
}

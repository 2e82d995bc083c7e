import { Button } from '@radix-ui/themes';
import { useState } from 'react';
import { isProblem } from '../../api/problem.ts';
import { type CertificateView } from '../../api/views.ts';
import { ConfirmIdentity } from '../../ui/confirm-identity.tsx';
import { Form } from '../../ui/form.tsx';
import { FormField } from '../../ui/form-field.tsx';
import { Strip } from '../../ui/strip.tsx';
import { useCorrectName } from './queries.ts';

/** A misspelt name is corrected by a new certificate with a new number. */
export function CorrectName({ certificate }: { certificate: CertificateView }) {
  const correct = useCorrectName(certificate.id);
  const [isOpen, setIsOpen] = useState(false);
  if (correct.isSuccess) {
    return (
      <section>
        <Strip kind="said">
          <b>Issued again</b> as <span className="mono">{correct.data.number}</span> for{' '}
          {correct.data.holderName}. The old number now says that it was replaced.
        </Strip>
      </section>
    );
  }
  return (
    <section>
      <h3>Correct the name</h3>
      <p className="fine">
        The certificate is issued again with the right name, a new number and the same dates. The
        old number then says that it was replaced.
      </p>
      {!isOpen && (
        <button type="button" className="text-button" onClick={() => setIsOpen(true)}>
          Correct the name
        </button>
      )}
      {isOpen && isProblem(correct.error, 'fresh-sign-in-needed') && (
        <ConfirmIdentity
          onConfirmed={() => correct.variables && correct.mutate(correct.variables)}
        />
      )}
      {isOpen && !isProblem(correct.error, 'fresh-sign-in-needed') && (
        <CorrectionForm
          problem={correct.error}
          busy={correct.isPending}
          onCorrect={(correction) => correct.mutate(correction)}
        />
      )}
    </section>
  );
}

interface CorrectionFormProps {
  problem: unknown;
  busy: boolean;
  onCorrect: (correction: { givenName: string; familyName: string; reason: string }) => void;
}

function CorrectionForm({ problem, busy, onCorrect }: CorrectionFormProps) {
  return (
    <Form
      label="Correct the name"
      problem={problem}
      onSubmit={({ givenName = '', familyName = '', reason = '' }) =>
        onCorrect({ givenName, familyName, reason })
      }
    >
      <FormField
        name="givenName"
        label="Given name"
        autoComplete="off"
        required
        maxLength={100}
        missing="Type the name as it should stand."
      />
      <FormField
        name="familyName"
        label="Family name"
        autoComplete="off"
        maxLength={100}
        hint="Leave it empty for a person of one name."
      />
      <FormField
        name="reason"
        label="Reason, kept in the history"
        autoComplete="off"
        required
        maxLength={500}
        missing="Say what was wrong with the name."
      />
      <Button type="submit" size="3" variant="outline" disabled={busy}>
        {busy ? 'Issuing again' : 'Issue it again'}
      </Button>
    </Form>
  );
}

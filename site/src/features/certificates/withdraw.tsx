import { Button } from '@radix-ui/themes';
import { isProblem } from '../../api/problem.ts';
import { type CertificateView } from '../../api/views.ts';
import { sayDate } from '../../ui/dates.ts';
import { ConfirmIdentity } from '../../ui/confirm-identity.tsx';
import { Form } from '../../ui/form.tsx';
import { FormField } from '../../ui/form-field.tsx';
import { useWithdraw } from './queries.ts';

/** Withdrawal with its reason, and beside it what the public check will say afterwards. */
export function Withdraw({ certificate }: { certificate: CertificateView }) {
  const withdraw = useWithdraw(certificate.id);
  const needsIdentity = isProblem(withdraw.error, 'fresh-sign-in-needed');
  return (
    <section className="withdrawal">
      <h3>Withdraw</h3>
      <p>
        The register page and the file check say so at once. It cannot be undone: a certificate
        withdrawn by mistake is issued anew. The reason is kept in the history and is not published.
      </p>
      <div className="before-after" role="img" aria-label={sayBeforeAfter(certificate)}>
        <p>
          <small>Now</small>
          <b>{certificate.state === 'valid' ? 'Valid' : 'Expired'}</b>
          <span>{sayPeriod(certificate)}</span>
        </p>
        <p className="afterwards">
          <small>Afterwards</small>
          <b>Withdrawn</b>
          <span>no name shown</span>
        </p>
      </div>
      {needsIdentity ? (
        <ConfirmIdentity
          onConfirmed={() => withdraw.variables && withdraw.mutate(withdraw.variables)}
        />
      ) : (
        <Form
          label="Withdraw"
          problem={withdraw.error}
          onSubmit={({ reason = '' }) => withdraw.mutate({ reason })}
        >
          <FormField
            name="reason"
            label="Reason, kept in the history"
            autoComplete="off"
            required
            maxLength={500}
            missing="Say why. The history keeps it."
            defaultValue={withdraw.variables?.reason ?? ''}
          />
          <Button type="submit" size="3" disabled={withdraw.isPending}>
            {withdraw.isPending ? 'Withdrawing' : `Withdraw ${certificate.number}`}
          </Button>
        </Form>
      )}
    </section>
  );
}

function sayPeriod({ state, expiresOn }: CertificateView): string {
  return `${state === 'valid' ? 'until' : 'on'} ${sayDate(expiresOn)}`;
}

function sayBeforeAfter(certificate: CertificateView): string {
  const now = certificate.state === 'valid' ? 'valid' : 'expired';
  return `The public check says ${now} now, and withdrawn, without the name, afterwards`;
}

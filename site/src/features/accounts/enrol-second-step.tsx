import { Button } from '@radix-ui/themes';
import { useMutation } from '@tanstack/react-query';
import { answerOf, api } from '../../api/client.ts';
import { isProblem } from '../../api/problem.ts';
import { ConfirmIdentity } from '../../ui/confirm-identity.tsx';
import { Form } from '../../ui/form.tsx';
import { ProblemCallout } from '../../ui/problem-callout.tsx';
import { CodeField } from './code-field.tsx';
import { RecoveryCodes } from './recovery-codes.tsx';

interface EnrolSecondStepProps {
  /** After the recovery codes have been kept. */
  onKept: () => void;
}

/** Three steps: get the secret, prove that the app has it, keep the recovery codes. */
export function EnrolSecondStep({ onKept }: EnrolSecondStepProps) {
  const begin = useMutation({ mutationFn: () => answerOf(api.POST('/api/me/second-factor')) });
  const prove = useMutation({
    mutationFn: (code: string) =>
      answerOf(api.POST('/api/me/second-factor/confirmation', { body: { code } })),
  });
  if (prove.isSuccess) {
    return <RecoveryCodes codes={prove.data.recoveryCodes} onKept={onKept} />;
  }
  if (isProblem(begin.error, 'fresh-sign-in-needed')) {
    return <ConfirmIdentity onConfirmed={() => begin.mutate()} />;
  }
  if (!begin.isSuccess) {
    return (
      <>
        <ProblemCallout error={begin.error} />
        <p>
          You need a phone with an authenticator app. It shows six figures that change every half
          minute.
        </p>
        <div className="actions">
          <Button size="3" disabled={begin.isPending} onClick={() => begin.mutate()}>
            Set up the second step
          </Button>
        </div>
      </>
    );
  }
  return (
    <>
      <ol className="enrol-steps">
        <li>
          <p>Point the app’s camera at this square.</p>
          <img
            className="qr"
            src={`data:image/svg+xml;utf8,${encodeURIComponent(begin.data.qrSvg)}`}
            alt="Square code that holds the secret below"
          />
          <p className="fine">
            Or type the secret: <span className="mono secret">{begin.data.secret}</span>
          </p>
        </li>
        <li>
          <p>Type the six figures it shows now.</p>
          <Form
            label="Prove the app"
            problem={prove.error}
            onSubmit={({ code = '' }) => prove.mutate(code)}
          >
            <CodeField label="Six figures" />
            <Button type="submit" size="3" disabled={prove.isPending}>
              {prove.isPending ? 'Checking' : 'Check the figures'}
            </Button>
          </Form>
        </li>
      </ol>
    </>
  );
}

import { Button } from '@radix-ui/themes';
import { useMutation, useQueryClient } from '@tanstack/react-query';
import { type ReactNode } from 'react';
import { answerOf, api } from '../../api/client.ts';
import { isProblem } from '../../api/problem.ts';
import { type RegisterAnswer } from '../../api/views.ts';
import { ProblemCallout } from '../../ui/problem-callout.tsx';
import { CertificateFacts } from './certificate-facts.tsx';
import { CheckWays } from './check-ways.tsx';
import { FileVerdict } from './file-verdict.tsx';
import { askTheServer, lookAtFile } from './look-at-file.ts';
import { type TypedCheck } from './number-form.tsx';
import { RegisterVerdict } from './register-verdict.tsx';

/** Checks by number and by file, the latest of them standing. */
export function useRegisterDesk() {
  const queryClient = useQueryClient();
  const asked = useMutation({ mutationFn: askTheServer });
  const looked = useMutation({
    mutationFn: (file: File) => lookAtFile(file, queryClient),
    onMutate: () => {
      typed.reset();
      asked.reset();
    },
  });
  const typed = useMutation({
    mutationFn: (body: TypedCheck) => answerOf(api.POST('/api/register/checks', { body })),
    onMutate: () => {
      looked.reset();
      asked.reset();
    },
  });
  return { typed, looked, asked };
}

export type RegisterDesk = ReturnType<typeof useRegisterDesk>;

interface DeskAnswerProps {
  desk: RegisterDesk;
  /** Stands until something has been checked. */
  children: ReactNode;
}

/** The answer of the latest check. */
export function DeskAnswer({ desk, children }: DeskAnswerProps) {
  const { typed, looked, asked } = desk;
  if (typed.isSuccess) {
    return <WholeAnswer answer={typed.data} typedNumber={typed.variables.number} />;
  }
  const report = asked.data ?? looked.data;
  if (!report || !looked.variables) return children;
  const file = looked.variables;
  if (report.register) {
    return <WholeAnswer answer={report.register} veryFile />;
  }
  return (
    <FileVerdict
      report={report}
      fileName={file.name}
      actions={<AskTheServer desk={desk} file={file} />}
    />
  );
}

interface WholeAnswerProps {
  answer: RegisterAnswer;
  typedNumber?: string;
  veryFile?: boolean;
}

/** Verdict, then what is printed on the certificate. */
export function WholeAnswer({ answer, typedNumber, veryFile = false }: WholeAnswerProps) {
  return (
    <>
      <RegisterVerdict answer={answer} typedNumber={typedNumber} />
      {veryFile && (
        <p className="very-file">
          <b>This is the very file that was issued.</b> Its signature was checked and holds.
        </p>
      )}
      {answer.certificate && (
        <CertificateFacts
          certificate={answer.certificate}
          withScope={answer.answer !== 'withdrawn'}
        />
      )}
    </>
  );
}

function AskTheServer({ desk, file }: { desk: RegisterDesk; file: File }) {
  const { asked, looked } = desk;
  if (looked.data?.finding === 'too-large') return null;
  if (asked.isSuccess) {
    return (
      <p className="todo" role="status">
        <b>The school’s server has looked at it too</b> and says the same.
      </p>
    );
  }
  return (
    <div className="actions not-printed">
      <ProblemCallout error={asked.error} />
      <Button
        size="3"
        variant="outline"
        disabled={asked.isPending}
        onClick={() => asked.mutate(file)}
      >
        {asked.isPending ? 'Sending the file' : 'Send it to the school’s server to look'}
      </Button>
      <small>Until you press this, the file stays on your device.</small>
    </div>
  );
}

/** The ways in, with what went wrong said as the register says it. */
export function DeskWays({ desk }: { desk: RegisterDesk }) {
  const { typed, looked } = desk;
  const busy = typed.isPending ? 'typed' : looked.isPending ? 'file' : null;
  const error = typed.error ?? looked.error;
  const isSilent = isProblem(error, 'no-answer');
  return (
    <>
      {isSilent && (
        <div className="problem across" role="alert">
          <b>The register did not answer</b>
          <p>
            We could not check it, so we cannot say whether it is valid. Nothing is wrong with the
            number. Check again when there is a signal.
          </p>
        </div>
      )}
      <CheckWays
        busy={busy}
        problem={isSilent ? null : error}
        onCheck={(check) => typed.mutate(check)}
        onFile={(file) => looked.mutate(file)}
      />
    </>
  );
}

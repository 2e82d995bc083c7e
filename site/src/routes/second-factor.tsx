import '../features/accounts/accounts.css';
import { Button } from '@radix-ui/themes';
import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { Navigate, useLocation, useNavigate } from 'react-router-dom';
import { answerOf, api } from '../api/client.ts';
import {
  homeOf,
  type LoaderArgs,
  needsSecondStep,
  readNext,
  requireSession,
  sessionQuery,
} from '../api/session.ts';
import { CodeField } from '../features/accounts/code-field.tsx';
import { EnrolSecondStep } from '../features/accounts/enrol-second-step.tsx';
import { useArrival } from '../features/accounts/sign-in-form.tsx';
import { Form } from '../ui/form.tsx';
import { PageTitle } from '../ui/page-title.tsx';
import { Sheet, SheetHead } from '../ui/sheet.tsx';

export async function loader(args: LoaderArgs) {
  await requireSession(args);
  return null;
}

export function Component() {
  const { data: session } = useQuery(sessionQuery);
  const queryClient = useQueryClient();
  const navigate = useNavigate();
  const { search } = useLocation();
  const carryOn = async () => {
    await queryClient.invalidateQueries({ queryKey: sessionQuery.queryKey });
    const fresh = await queryClient.fetchQuery(sessionQuery);
    if (fresh) await navigate(readNext(search) ?? homeOf(fresh));
  };
  if (!session) return null;
  if (session.secondFactor === 'to-enrol') return <ToEnrol onKept={() => void carryOn()} />;
  if (!needsSecondStep(session))
    return <Navigate replace to={readNext(search) ?? homeOf(session)} />;
  return <ToGive />;
}

function ToEnrol({ onKept }: { onKept: () => void }) {
  return (
    <Sheet width="narrow">
      <PageTitle>Set up the second step</PageTitle>
      <SheetHead
        kicker="Account"
        title="Set up the second step"
        standfirst="An administrator can withdraw certificates and suspend people, so the passphrase alone does not open that door."
      />
      <section className="section">
        <EnrolSecondStep onKept={onKept} />
      </section>
    </Sheet>
  );
}

function ToGive() {
  const arrive = useArrival();
  const give = useMutation({
    mutationFn: (code: string) =>
      answerOf(api.POST('/api/session/second-factor', { body: { code } })),
    onSuccess: arrive,
  });
  return (
    <Sheet width="narrow">
      <PageTitle>Second step</PageTitle>
      <SheetHead
        kicker="Account"
        title="Second step"
        standfirst="Type the six figures your authenticator app shows now."
      />
      <div className="account-columns">
        <div>
          <Form
            label="Second step"
            problem={give.error}
            onSubmit={({ code = '' }) => give.mutate(code)}
          >
            <CodeField label="Code" hint="Six figures, or one of your recovery codes." />
            <Button type="submit" size="3" disabled={give.isPending}>
              {give.isPending ? 'Checking' : 'Carry on'}
            </Button>
          </Form>
        </div>
        <aside>
          <h2>Without the phone</h2>
          <p>Use a recovery code. Each works once, so cross it off afterwards.</p>
          <h2>The figures are refused</h2>
          <p>Wait for the next ones. Check that the phone sets its clock by itself.</p>
        </aside>
      </div>
    </Sheet>
  );
}

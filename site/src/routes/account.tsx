import '../features/accounts/accounts.css';
import { useQuery, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { sayRoles } from '../api/role-names.ts';
import { type LoaderArgs, requireSession, sessionQuery } from '../api/session.ts';
import { type SessionView } from '../api/views.ts';
import { ChangeEmail } from '../features/accounts/change-email.tsx';
import { ChangePassphrase } from '../features/accounts/change-passphrase.tsx';
import { EnrolSecondStep } from '../features/accounts/enrol-second-step.tsx';
import { LightOrDark } from '../features/accounts/light-or-dark.tsx';
import { OwnSessions } from '../features/accounts/own-sessions.tsx';
import { PageTitle } from '../ui/page-title.tsx';
import { Sheet, SheetHead } from '../ui/sheet.tsx';
import { TitleBlock } from '../ui/title-block.tsx';

export async function loader(args: LoaderArgs) {
  await requireSession(args);
  return null;
}

export function Component() {
  const { data: session } = useQuery(sessionQuery);
  if (!session) return null;
  const { givenName, familyName, email, roles } = session.account;
  return (
    <Sheet width="narrow" className="own-account">
      <PageTitle>Your account</PageTitle>
      <SheetHead
        kicker="Account"
        title={`${givenName} ${familyName}`.trim()}
        titleBlock={
          <TitleBlock
            cells={[
              { label: 'Email', value: email, span: 6 },
              { label: 'Roles', value: sayRoles(roles), span: 6 },
            ]}
          />
        }
      />
      <div className="columns two">
        <section>
          <h2>Passphrase</h2>
          <ChangePassphrase />
        </section>
        <section>
          <h2>Email</h2>
          <ChangeEmail email={email} />
        </section>
      </div>
      <div className="columns two">
        <section>
          <h2>Where you are signed in</h2>
          <OwnSessions />
        </section>
        <section>
          {roles.includes('administrator') && <SecondStep session={session} />}
          <h2>Light or dark</h2>
          <LightOrDark />
        </section>
      </div>
    </Sheet>
  );
}

function SecondStep({ session }: { session: SessionView }) {
  const queryClient = useQueryClient();
  const [isEnrolling, setIsEnrolling] = useState(false);
  if (isEnrolling) {
    return (
      <EnrolSecondStep
        onKept={() => {
          setIsEnrolling(false);
          void queryClient.invalidateQueries({ queryKey: sessionQuery.queryKey });
        }}
      />
    );
  }
  return (
    <div className="second-step">
      <h2>Second step</h2>
      <p>
        {session.secondFactor === 'to-enrol'
          ? 'Not set up yet. An administrator’s sign-in needs it.'
          : 'On. Sign-in asks for a code from your authenticator app.'}
      </p>
      <button type="button" className="text-button" onClick={() => setIsEnrolling(true)}>
        {session.secondFactor === 'to-enrol' ? 'Set it up' : 'Set it up on another phone'}
      </button>
    </div>
  );
}

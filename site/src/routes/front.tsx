import '../features/front/front.css';
import { useQuery } from '@tanstack/react-query';
import { Link } from 'react-router-dom';
import { sessionQuery, homeOf } from '../api/session.ts';
import { SignInForm } from '../features/accounts/sign-in-form.tsx';
import { Demonstration } from '../features/front/demonstration.tsx';
import { ExplodedFerrule } from '../features/front/exploded-ferrule.tsx';
import { frontQuery } from '../features/front/queries.ts';
import { WhatACourseHolds } from '../features/front/what-a-course-holds.tsx';
import { CheckFromHere } from '../features/register/number-form.tsx';
import '../features/register/register.css';
import { PageTitle } from '../ui/page-title.tsx';
import { Sheet } from '../ui/sheet.tsx';
import { EmptyState, FailedState, RuledLines } from '../ui/states.tsx';

export function Component() {
  const front = useQuery(frontQuery);
  return (
    <Sheet className="front">
      <PageTitle>Training and certification for DC installers</PageTitle>
      <header className="sheet-head">
        <div className="sheet-title">
          <h1>The handbook for DC installers, with the examination bound in</h1>
          <p className="standfirst">
            Batteries, chargers, solar and wiring in vans, work vehicles and small craft. Study the
            sheets, work the questions, sit the paper, and carry a certificate an employer can
            check.
          </p>
        </div>
        <Entrance />
      </header>
      <ExplodedFerrule />
      {front.isPending && <RuledLines what="the course" />}
      {front.isError && <FailedState error={front.error} retry={() => void front.refetch()} />}
      {front.data?.course && (
        <WhatACourseHolds course={front.data.course} school={front.data.school} />
      )}
      {front.data && !front.data.course && (
        <EmptyState title="No course is issued yet">
          Certificates can be checked all the same.
        </EmptyState>
      )}
      <div className="action-strip front-check">
        <CheckFromHere />
        <p className="fine">
          Employers and customers: type the number and the family name, or point a camera at the
          code on the certificate. No account needed.
        </p>
      </div>
      {front.data?.demonstration && (
        <Demonstration people={front.data.people} joinCode={front.data.joinCode} />
      )}
      <p className="local-code">
        Ferrule trains and examines. Your local code and licensed practice come first: prove a
        circuit dead before you touch it, and have work signed off where the law asks for it.
      </p>
    </Sheet>
  );
}

function Entrance() {
  const { data: session } = useQuery(sessionQuery);
  if (session) {
    return (
      <div className="front-entrance">
        <h2>You are signed in</h2>
        <p>
          {session.account.givenName} {session.account.familyName}
        </p>
        <p className="entrance-links">
          <Link to={homeOf(session)}>Carry on</Link>
        </p>
      </div>
    );
  }
  return (
    <div className="front-entrance">
      <h2>Sign in</h2>
      <SignInForm />
      <p className="entrance-links">
        <Link to="/reset">Forgotten passphrase</Link>
        <Link to="/sign-up">Open an account</Link>
      </p>
    </div>
  );
}

import '../features/register/register.css';
import { Button } from '@radix-ui/themes';
import { useQuery } from '@tanstack/react-query';
import { Link, useParams } from 'react-router-dom';
import { isProblem } from '../api/problem.ts';
import { CheckFromHere } from '../features/register/number-form.tsx';
import { linkQuery } from '../features/register/queries.ts';
import { WholeAnswer } from '../features/register/register-desk.tsx';
import { useFocusAfterWait } from '../ui/focus-on-heading.ts';
import { PageTitle } from '../ui/page-title.tsx';
import { Sheet, SheetHead } from '../ui/sheet.tsx';
import { RuledLines } from '../ui/states.tsx';

/** The page behind the code printed on a certificate: it needs no name. */
export function Component() {
  const { code = '' } = useParams();
  const check = useQuery(linkQuery(code));
  useFocusAfterWait(!check.isPending);
  return (
    <Sheet width="narrow" busy={check.isPending}>
      <PageTitle>Certificate check</PageTitle>
      {check.isPending && (
        <>
          <SheetHead kicker="Register" title="Checking the certificate" />
          <RuledLines what="the register’s answer" />
        </>
      )}
      {check.isError && <NoAnswer error={check.error} retry={() => void check.refetch()} />}
      {check.data && <WholeAnswer answer={check.data} />}
      <div className="check-ways not-printed">
        <CheckFromHere />
        <p className="fine">
          This page shows what is printed on the certificate and nothing else. Make sure that the
          address in your browser is the school’s.
        </p>
      </div>
    </Sheet>
  );
}

function NoAnswer({ error, retry }: { error: unknown; retry: () => void }) {
  const isTooMany = isProblem(error, 'too-many-attempts');
  return (
    <SheetHead
      kicker="Register"
      title={isTooMany ? 'Too many checks from here' : 'The register did not answer'}
      standfirst={
        isTooMany
          ? 'Wait a minute and check again. We cannot say yet whether the certificate is valid.'
          : 'We could not check it, so we cannot say whether it is valid. Nothing is wrong with the certificate.'
      }
    >
      <div className="actions">
        <Button size="3" onClick={retry}>
          Check again
        </Button>
        <Link to="/check">Check by number</Link>
      </div>
    </SheetHead>
  );
}

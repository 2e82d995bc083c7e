import '../features/accounts/accounts.css';
import { useLocation } from 'react-router-dom';
import { SendLinkAgain } from '../features/accounts/send-link-again.tsx';
import { PageTitle } from '../ui/page-title.tsx';
import { Sheet, SheetHead } from '../ui/sheet.tsx';

function readEmail(state: unknown): string | undefined {
  if (typeof state !== 'object' || state === null || !('email' in state)) return undefined;
  return typeof state.email === 'string' ? state.email : undefined;
}

export function Component() {
  const location = useLocation();
  const email = readEmail(location.state);
  return (
    <Sheet width="narrow">
      <PageTitle>Check your email</PageTitle>
      <SheetHead
        kicker="Account"
        title="Check your email"
        standfirst={
          email ? (
            <>
              A link went to <b>{email}</b>. Open it on any device; it works once.
            </>
          ) : (
            'Open the link in the mail on any device; it works once.'
          )
        }
      />
      <div className="account-columns halves">
        <section>
          <h2>Nothing has come</h2>
          <ul className="dash-list">
            <li>Look in spam for a mail from Ferrule.</li>
            <li>A works address may hold it for a few minutes.</li>
            <li>If the address already has an account, the mail says so instead.</li>
          </ul>
        </section>
        <section>
          <h2>Send the link again</h2>
          <SendLinkAgain email={email} />
        </section>
      </div>
    </Sheet>
  );
}

import { Link } from 'react-router-dom';
import { answerOf, api } from '../api/client.ts';
import { PressToConfirm } from '../features/accounts/press-to-confirm.tsx';
import { PageTitle } from '../ui/page-title.tsx';
import { Sheet, SheetHead } from '../ui/sheet.tsx';
import { TickSign } from '../ui/symbols/signs.tsx';

export function Component() {
  return (
    <Sheet width="narrow">
      <PageTitle>Confirm your email</PageTitle>
      <SheetHead
        kicker="Account"
        title="Confirm your email"
        standfirst="One press and the address is yours. The link works once."
      />
      <section className="section">
        <PressToConfirm
          label="Confirm my address"
          busyLabel="Confirming"
          send={(token) => answerOf(api.POST('/api/email-confirmations', { body: { token } }))}
          done={(email) => (
            <>
              <p>
                <TickSign className="passed" />
                <b>Confirmed.</b> {email} is yours.
              </p>
              <p className="actions">
                <Link to="/sign-in">Sign in</Link>
              </p>
            </>
          )}
          otherwise={<Link to="/sign-up/sent">Send a new link</Link>}
        />
      </section>
    </Sheet>
  );
}

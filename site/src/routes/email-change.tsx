import { Link } from 'react-router-dom';
import { answerOf, api } from '../api/client.ts';
import { PressToConfirm } from '../features/accounts/press-to-confirm.tsx';
import { PageTitle } from '../ui/page-title.tsx';
import { Sheet, SheetHead } from '../ui/sheet.tsx';
import { TickSign } from '../ui/symbols/signs.tsx';

export function Component() {
  return (
    <Sheet width="narrow">
      <PageTitle>Your new address</PageTitle>
      <SheetHead
        kicker="Account"
        title="Your new address"
        standfirst="Press the button and mail comes to this address from now on. The old address is told, with a link to undo it."
      />
      <section className="section">
        <PressToConfirm
          label="Use this address"
          busyLabel="Changing"
          send={(token) =>
            answerOf(api.POST('/api/email-changes/confirmations', { body: { token } }))
          }
          done={(email) => (
            <>
              <p>
                <TickSign className="passed" />
                <b>Changed.</b> Sign in with {email} from now on.
              </p>
              <p className="actions">
                <Link to="/account">To your account</Link>
              </p>
            </>
          )}
          otherwise={<Link to="/account">Ask for a new link in your account</Link>}
        />
      </section>
    </Sheet>
  );
}

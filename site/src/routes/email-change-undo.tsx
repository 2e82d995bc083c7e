import { Link } from 'react-router-dom';
import { answerOf, api } from '../api/client.ts';
import { PressToConfirm } from '../features/accounts/press-to-confirm.tsx';
import { PageTitle } from '../ui/page-title.tsx';
import { Sheet, SheetHead } from '../ui/sheet.tsx';
import { TickSign } from '../ui/symbols/signs.tsx';

export function Component() {
  return (
    <Sheet width="narrow">
      <PageTitle>Keep the old address</PageTitle>
      <SheetHead
        kicker="Account"
        title="Keep the old address"
        standfirst="If you did not ask for the change of address, undo it here and then choose a new passphrase."
      />
      <section className="section">
        <PressToConfirm
          label="Undo the change"
          busyLabel="Undoing"
          send={(token) => answerOf(api.POST('/api/email-changes/undo', { body: { token } }))}
          done={(email) => (
            <>
              <p>
                <TickSign className="passed" />
                <b>Undone.</b> The account belongs to {email} again.
              </p>
              <p className="actions">
                <Link to="/reset">Choose a new passphrase</Link>
              </p>
            </>
          )}
          otherwise={<Link to="/reset">Choose a new passphrase</Link>}
        />
      </section>
    </Sheet>
  );
}

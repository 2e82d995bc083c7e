import '../features/accounts/accounts.css';
import { PassphraseHints } from '../features/accounts/passphrase-hints.tsx';
import { SignUpForm } from '../features/accounts/sign-up-form.tsx';
import { PageTitle } from '../ui/page-title.tsx';
import { Sheet, SheetHead } from '../ui/sheet.tsx';

export function Component() {
  return (
    <Sheet width="narrow">
      <PageTitle>Open an account</PageTitle>
      <SheetHead
        kicker="Account"
        title="Open an account"
        standfirst="One account for study, papers and your certificates. Give your name as it should stand on a certificate."
      />
      <div className="account-columns">
        <div>
          <SignUpForm />
        </div>
        <aside>
          <PassphraseHints />
          <h2>What happens next</h2>
          <ol className="next-steps">
            <li className="current">
              <b>Open account</b>
            </li>
            <li>
              <b>Confirm your email</b>
              <small>a link comes by mail and works once</small>
            </li>
            <li>
              <b>Join your class</b>
              <small>with the code your trainer gives you</small>
            </li>
          </ol>
        </aside>
      </div>
    </Sheet>
  );
}

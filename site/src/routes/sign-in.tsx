import { Link } from 'react-router-dom';
import { SignInForm } from '../features/accounts/sign-in-form.tsx';
import '../features/accounts/accounts.css';
import { PageTitle } from '../ui/page-title.tsx';
import { Sheet, SheetHead } from '../ui/sheet.tsx';

export function Component() {
  return (
    <Sheet width="narrow">
      <PageTitle>Sign in</PageTitle>
      <SheetHead kicker="Account" title="Sign in" />
      <div className="account-columns">
        <div>
          <SignInForm />
        </div>
        <aside>
          <h2>No account yet</h2>
          <p>One account for study, papers and your certificates.</p>
          <p>
            <Link to="/sign-up">Open an account</Link>
          </p>
          <h2>Cannot get in</h2>
          <ul className="dash-list">
            <li>
              <Link to="/reset">Forgotten passphrase</Link>
            </li>
            <li>
              The address must be confirmed first.{' '}
              <Link to="/sign-up/sent">Send the link again</Link>
            </li>
            <li>After several wrong tries, sign-in waits for a while.</li>
          </ul>
        </aside>
      </div>
    </Sheet>
  );
}

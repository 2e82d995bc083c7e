import { Link } from 'react-router-dom';
import { PageTitle } from '../ui/page-title.tsx';
import { Sheet, SheetHead } from '../ui/sheet.tsx';

export function Component() {
  return (
    <Sheet width="narrow">
      <PageTitle>No such sheet</PageTitle>
      <SheetHead
        title="There is no such sheet"
        standfirst="The address may have been mistyped, or the sheet has been renumbered. Nothing you saved is affected."
      >
        <div className="actions">
          <Link to="/">To the front page</Link>
          <Link to="/check">Check a certificate</Link>
        </div>
      </SheetHead>
    </Sheet>
  );
}

import { useState } from 'react';
import { Navigate } from 'react-router-dom';
import { Outbox } from './outbox.ts';

/** To the result, and there it is said what did not arrive in time. */
export function HandedIn({ sittingId }: { sittingId: string }) {
  const [late] = useState(() => {
    const outbox = new Outbox(sittingId);
    const count = outbox.size;
    outbox.empty();
    return count;
  });
  return <Navigate to={`/sittings/${sittingId}/result`} state={{ late }} replace />;
}

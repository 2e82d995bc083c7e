import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { Link, Outlet, useLocation, useNavigate } from 'react-router-dom';
import { answerOf, api } from '../api/client.ts';
import { changeSession, needsSecondStep, sessionQuery } from '../api/session.ts';
import { type Role, type SessionView } from '../api/views.ts';
import { HeadSearch } from '../features/search/head-search.tsx';
import { RunningHead } from '../ui/running-head.tsx';

const publicLinks = [{ label: 'Check a certificate', to: '/check' }];

const linksByRole: Record<Role, { label: string; to: string }[]> = {
  trainee: [
    { label: 'Course map', to: '/course' },
    { label: 'Practice', to: '/practice' },
    { label: 'My record', to: '/record' },
  ],
  trainer: [{ label: 'Classes', to: '/classes' }],
  'certification-manager': [
    { label: 'Results', to: '/results' },
    { label: 'Certificates', to: '/certificates' },
  ],
  administrator: [
    { label: 'People', to: '/people' },
    { label: 'Certificates', to: '/certificates' },
  ],
};

function linksFor(session: SessionView | null | undefined) {
  if (!session || needsSecondStep(session)) return publicLinks;
  const links = session.account.roles.flatMap((role) => linksByRole[role]);
  return links.filter((link, index) => links.findIndex(({ to }) => to === link.to) === index);
}

/** Running head by role, then the page. */
export function Shell() {
  const { data: session } = useQuery(sessionQuery);
  const { pathname } = useLocation();
  const offersSignIn = session === null && pathname !== '/' && pathname !== '/sign-in';
  return (
    <>
      <RunningHead
        links={linksFor(session)}
        end={
          <>
            {offersSignIn && <Link to="/sign-in">Sign in</Link>}
            {session && !needsSecondStep(session) && <HeadSearch />}
          </>
        }
        own={session && <SignedIn session={session} />}
      />
      <Outlet />
    </>
  );
}

function SignedIn({ session }: { session: SessionView }) {
  const queryClient = useQueryClient();
  const navigate = useNavigate();
  const signOut = useMutation({
    mutationFn: () => answerOf(api.DELETE('/api/session')),
    onSuccess: async () => {
      await navigate('/');
      changeSession(queryClient, null);
    },
  });
  const { givenName, familyName } = session.account;
  return (
    <>
      <Link className="own-name" to="/account">
        {givenName} {familyName}
      </Link>
      <button
        type="button"
        className="text-button"
        disabled={signOut.isPending}
        onClick={() => signOut.mutate()}
      >
        Sign out
      </button>
    </>
  );
}

import { type QueryClient, queryOptions } from '@tanstack/react-query';
import { redirect, type RouterContextProvider } from 'react-router-dom';
import { answerOf, api } from './client.ts';
import { isProblem } from './problem.ts';
import { queryClientContext } from './query-client.ts';
import { type Role, type SessionView } from './views.ts';

/** Who is here; null when nobody is signed in. */
export const sessionQuery = queryOptions({
  queryKey: ['session'],
  queryFn: async ({ signal }): Promise<SessionView | null> => {
    try {
      return await answerOf(api.GET('/api/session', { signal }));
    } catch (error) {
      if (isProblem(error, 'not-signed-in')) return null;
      throw error;
    }
  },
  staleTime: 60_000,
  meta: { personal: false },
});

/**
 * Somebody else is here now, or nobody: what was fetched for the last person is forgotten. A
 * query marked `meta: { personal: false }` is the same for everybody and stays.
 */
export function changeSession(queryClient: QueryClient, session: SessionView | null): void {
  queryClient.setQueryData(sessionQuery.queryKey, session);
  queryClient.removeQueries({ predicate: ({ meta }) => meta?.['personal'] !== false });
}

/** What a loader is given; `context` holds the query cache. */
export interface LoaderArgs {
  context: Readonly<RouterContextProvider>;
  request: Request;
  params: Partial<Record<string, string>>;
}

export const cacheOf = ({ context }: Pick<LoaderArgs, 'context'>) =>
  context.get(queryClientContext);

/** Where to go after signing in: only a path of this site. */
export function readNext(search: string): string | null {
  const next = new URLSearchParams(search).get('next');
  return next?.startsWith('/') && !next.startsWith('//') && !next.includes('\\') ? next : null;
}

/**
 * For loaders of pages that need a session: gives it, or sends the person to sign in (or to
 * the second step) and back here afterwards. With roles named, one of them is needed.
 */
export async function requireSession(
  args: Pick<LoaderArgs, 'context' | 'request'>,
  ...roles: Role[]
): Promise<SessionView> {
  const session = await cacheOf(args).ensureQueryData(sessionQuery);
  const url = new URL(args.request.url);
  const next = encodeURIComponent(url.pathname + url.search);
  if (!session) sendTo(`/sign-in?next=${next}`);
  if (!holdsOneOf(session, roles)) sendTo('/problems/not-allowed');
  if (roles.length > 0 && needsSecondStep(session)) sendTo(`/second-factor?next=${next}`);
  return session;
}

function holdsOneOf({ account }: SessionView, roles: Role[]): boolean {
  return roles.length === 0 || roles.some((role) => account.roles.includes(role));
}

function sendTo(path: string): never {
  // The router takes a thrown response as "go there instead".
  // eslint-disable-next-line @typescript-eslint/only-throw-error
  throw redirect(path);
}

export function needsSecondStep(session: SessionView): boolean {
  return session.secondFactor === 'needed' || session.secondFactor === 'to-enrol';
}

/** The page a person lands on after signing in. */
export function homeOf(session: SessionView): string {
  if (needsSecondStep(session)) return '/second-factor';
  const { roles } = session.account;
  if (roles.includes('administrator')) return '/people';
  if (roles.includes('certification-manager')) return '/results';
  if (roles.includes('trainer')) return '/classes';
  return '/course';
}

import { queryOptions, useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { answerOf, api } from '../../api/client.ts';
import { type OwnSession } from '../../api/views.ts';
import { sayMoment } from '../../ui/dates.ts';
import { ProblemCallout } from '../../ui/problem-callout.tsx';
import { FailedState, RuledLines } from '../../ui/states.tsx';

const ownSessionsQuery = queryOptions({
  queryKey: ['own-sessions'],
  queryFn: ({ signal }) => answerOf(api.GET('/api/me/sessions', { signal })),
});

export function OwnSessions() {
  const sessions = useQuery(ownSessionsQuery);
  const queryClient = useQueryClient();
  const end = useMutation({
    mutationFn: (id: string | null) =>
      id === null
        ? answerOf(api.DELETE('/api/me/sessions'))
        : answerOf(api.DELETE('/api/me/sessions/{id}', { params: { path: { id } } })),
    onSettled: () => queryClient.invalidateQueries({ queryKey: ownSessionsQuery.queryKey }),
  });
  if (sessions.isPending) return <RuledLines what="your sessions" />;
  if (sessions.isError) {
    return <FailedState error={sessions.error} retry={() => void sessions.refetch()} />;
  }
  const others = sessions.data.sessions.filter((session) => !session.current);
  return (
    <>
      <ProblemCallout error={end.error} />
      <table className="session-list">
        <caption className="visually-hidden">Where you are signed in</caption>
        <tbody>
          {sessions.data.sessions.map((session) => (
            <SessionRow
              key={session.id}
              session={session}
              busy={end.isPending}
              onEnd={() => end.mutate(session.id)}
            />
          ))}
        </tbody>
      </table>
      {others.length > 0 && (
        <button
          type="button"
          className="text-button"
          disabled={end.isPending}
          onClick={() => end.mutate(null)}
        >
          End all others
        </button>
      )}
    </>
  );
}

interface SessionRowProps {
  session: OwnSession;
  busy: boolean;
  onEnd: () => void;
}

function SessionRow({ session, busy, onEnd }: SessionRowProps) {
  return (
    <tr>
      <td>
        <b>{session.device}</b>
        <small>
          since {sayMoment(session.startedAt)}, used {sayMoment(session.lastSeenAt)}, from{' '}
          {session.address}
        </small>
      </td>
      <td className="number">
        {session.current ? (
          'This one'
        ) : (
          <button type="button" className="text-button" disabled={busy} onClick={onEnd}>
            End <span className="visually-hidden">the session on {session.device}</span>
          </button>
        )}
      </td>
    </tr>
  );
}

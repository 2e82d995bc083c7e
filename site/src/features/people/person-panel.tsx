import { useQuery } from '@tanstack/react-query';
import { type PersonView } from '../../api/views.ts';
import { sayDate, sayMoment } from '../../ui/dates.ts';
import { ProblemCallout } from '../../ui/problem-callout.tsx';
import { FailedState, RuledLines } from '../../ui/states.tsx';
import { useEndSessions, useStartReset } from './mutations.ts';
import { sayName } from './people-table.tsx';
import { personQuery } from './queries.ts';
import { RoleTicks } from './role-ticks.tsx';
import { Suspension } from './suspension.tsx';

/** Whoever chose a name in the list goes on reading here. */
function takeFocusFromList(heading: HTMLElement | null) {
  if (document.activeElement?.closest('.people-table')) heading?.focus();
}

interface PersonPanelProps {
  id: string;
  /** The administrator who is looking. */
  ownId: string;
}

export function PersonPanel({ id, ownId }: PersonPanelProps) {
  const person = useQuery(personQuery(id));
  if (person.isPending) return <RuledLines what="this person" />;
  if (person.isError) {
    return <FailedState error={person.error} retry={() => void person.refetch()} />;
  }
  const view = person.data.person;
  const isSelf = view.id === ownId;
  return (
    <>
      <header>
        <p className="kicker">Since {sayDate(view.joinedAt)}</p>
        <h2 id="person-title" tabIndex={-1} ref={takeFocusFromList}>
          {sayName(view)}
        </h2>
        <p>{view.email}</p>
      </header>
      <RoleTicks person={view} isSelf={isSelf} />
      <Sessions person={view} />
      {isSelf ? (
        <section>
          <p className="fine">
            Your own role and suspension are another administrator’s to decide.
          </p>
        </section>
      ) : (
        <Suspension key={view.id} person={view} />
      )}
      <Lately lately={person.data.lately} />
    </>
  );
}

function Sessions({ person }: { person: PersonView }) {
  const endSessions = useEndSessions(person.id);
  const startReset = useStartReset(person.id);
  return (
    <section>
      <h3>Sessions and passphrase</h3>
      <p>{saySessions(person.sessions)}</p>
      <ProblemCallout error={endSessions.error ?? startReset.error} />
      <button
        type="button"
        className="text-button"
        disabled={person.sessions === 0 || endSessions.isPending}
        onClick={() => endSessions.mutate(undefined)}
      >
        End every session
      </button>
      <br />
      <button
        type="button"
        className="text-button"
        disabled={startReset.isPending || startReset.isSuccess}
        onClick={() => startReset.mutate(undefined)}
      >
        {startReset.isSuccess ? 'Link sent' : 'Mail a link for a new passphrase'}
      </button>
    </section>
  );
}

function saySessions(count: number): string {
  if (count === 0) return 'Not signed in anywhere.';
  return count === 1 ? 'Signed in once.' : `Signed in ${count} times.`;
}

function Lately({ lately }: { lately: { at: string; what: string }[] }) {
  if (lately.length === 0) return null;
  return (
    <section>
      <h3>Lately</h3>
      <ul className="lately">
        {lately.map((entry) => (
          <li key={entry.at + entry.what}>
            <span>{sayMoment(entry.at)}</span>
            <span>{entry.what}</span>
          </li>
        ))}
      </ul>
    </section>
  );
}

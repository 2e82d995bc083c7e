import { Button } from '@radix-ui/themes';
import { type PersonView } from '../../api/views.ts';
import { sayMoment } from '../../ui/dates.ts';
import { Form } from '../../ui/form.tsx';
import { FormField } from '../../ui/form-field.tsx';
import { ProblemCallout } from '../../ui/problem-callout.tsx';
import { useReinstate, useSuspend } from './mutations.ts';
import { sayName } from './people-table.tsx';

export function Suspension({ person }: { person: PersonView }) {
  return person.suspended ? (
    <Suspended person={person} suspended={person.suspended} />
  ) : (
    <Suspend person={person} />
  );
}

function Suspend({ person }: { person: PersonView }) {
  const suspend = useSuspend(person.id);
  return (
    <section className="suspension">
      <h3>Suspend</h3>
      <p>
        {sayEnding(person.sessions)} Nothing is deleted: answers, results and certificates stay as
        they are, and certificates can still be checked.
      </p>
      <Form
        label={`Suspend ${sayName(person)}`}
        problem={suspend.error}
        onSubmit={({ reason = '' }) => suspend.mutate(reason)}
      >
        <FormField
          name="reason"
          label="Reason, kept in the log"
          autoComplete="off"
          required
          maxLength={500}
          missing="Say why; whoever lifts it later will want to know."
        />
        <Button type="submit" size="3" disabled={suspend.isPending}>
          {suspend.isPending ? 'Suspending' : `Suspend ${sayName(person)}`}
        </Button>
      </Form>
    </section>
  );
}

function sayEnding(sessions: number): string {
  if (sessions === 0) return 'Stops sign-in at once.';
  const which = sessions === 1 ? 'their session' : `all ${sessions} sessions`;
  return `Ends ${which} at once and stops sign-in.`;
}

interface SuspendedProps {
  person: PersonView;
  suspended: { at: string; reason: string };
}

function Suspended({ person, suspended }: SuspendedProps) {
  const reinstate = useReinstate(person.id);
  return (
    <section className="suspension">
      <h3>Suspended since {sayMoment(suspended.at)}</h3>
      <p>Reason: {suspended.reason}</p>
      <ProblemCallout error={reinstate.error} />
      <Button size="3" disabled={reinstate.isPending} onClick={() => reinstate.mutate(undefined)}>
        {reinstate.isPending ? 'Reinstating' : `Reinstate ${sayName(person)}`}
      </Button>
    </section>
  );
}

import { Button } from '@radix-ui/themes';
import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { sayDate } from '../../ui/dates.ts';
import { Form } from '../../ui/form.tsx';
import { FormField } from '../../ui/form-field.tsx';
import { FailedState, RuledLines } from '../../ui/states.tsx';
import { allowancesQuery, grantTime, type TimeAllowance } from './queries.ts';

/** Extra time, granted to a person before they sit; it is added when their paper starts. */
export function TimeAllowances() {
  const list = useQuery(allowancesQuery);
  return (
    <div className="columns two time-allowances">
      <section>
        <h2>Extra time</h2>
        <p>
          For a candidate who asked for it because of a disability or for another good reason. It is
          added when the paper starts and is not told to trainers or printed on the certificate.
        </p>
        {list.isPending && <RuledLines what="the extra times" />}
        {list.isError && <FailedState error={list.error} retry={() => void list.refetch()} />}
        {list.data && <Granted allowances={list.data.allowances} />}
      </section>
      <section>
        <h2>Grant extra time</h2>
        <GrantForm />
      </section>
    </div>
  );
}

function Granted({ allowances }: { allowances: TimeAllowance[] }) {
  if (allowances.length === 0) return <p className="fine">Nobody has extra time.</p>;
  return (
    <table className="allowances-table">
      <caption className="visually-hidden">Extra times granted</caption>
      <thead>
        <tr>
          <th scope="col">Candidate</th>
          <th scope="col" className="number">
            More
          </th>
          <th scope="col">Granted</th>
        </tr>
      </thead>
      <tbody>
        {allowances.map((one) => (
          <tr key={one.email}>
            <th scope="row">
              {one.name}
              <small>{one.email}</small>
            </th>
            <td className="number">{one.percent} %</td>
            <td>
              {sayDate(one.grantedAt)}
              <small>{one.reason}</small>
            </td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}

function GrantForm() {
  const cache = useQueryClient();
  // A new form after each grant: its entries begin empty.
  const [grants, setGrants] = useState(0);
  const grant = useMutation({
    mutationFn: grantTime,
    onSuccess: (list) => {
      cache.setQueryData(allowancesQuery.queryKey, list);
      setGrants((count) => count + 1);
    },
  });
  return (
    <Form
      key={grants}
      label="Grant extra time"
      problem={grant.error}
      onSubmit={({ email = '', percent = '', reason = '' }) =>
        grant.mutate({ email, percent: Number(percent), reason })
      }
    >
      <FormField
        name="email"
        label="Candidate’s e-mail address"
        type="email"
        required
        missing="Give the address the candidate signs in with."
        autoComplete="off"
      />
      <FormField
        name="percent"
        label="More time, per cent"
        hint="25 makes 75 minutes of 60; 100 doubles the time."
        inputMode="numeric"
        required
        pattern="[0-9]{1,3}"
        missing="Give the extra time in per cent."
        wrong="Whole per cent, in figures."
        autoComplete="off"
      />
      <FormField
        name="reason"
        label="Reason, kept with the grant"
        required
        missing="Say why, in a few words."
        maxLength={500}
        autoComplete="off"
      />
      <Button type="submit" size="3" variant="outline" disabled={grant.isPending}>
        {grant.isPending ? 'Granting' : 'Grant the time'}
      </Button>
      <p role="status" className="fine">
        {grant.isSuccess && grants > 0 && 'Granted. It counts from the next paper that is started.'}
      </p>
    </Form>
  );
}

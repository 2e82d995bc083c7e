import { Button } from '@radix-ui/themes';
import { useMutation, useQueryClient } from '@tanstack/react-query';
import { Form } from '../../ui/form.tsx';
import { FormField } from '../../ui/form-field.tsx';
import { classesQuery, openClass } from './queries.ts';

const emailsIn = (text: string) => text.split(/[\s,;]+/).filter(Boolean);

/** For administrators: a class with its days and trainers; its code comes back. */
export function OpenClass() {
  const queryClient = useQueryClient();
  const open = useMutation({
    mutationFn: openClass,
    onSuccess: () => queryClient.invalidateQueries({ queryKey: classesQuery.queryKey }),
  });
  const opened = open.data?.class;
  return (
    <section className="section open-class" aria-labelledby="open-class-title">
      <h2 id="open-class-title">Open a class</h2>
      <Form
        key={opened?.id}
        label="Open a class"
        problem={open.error}
        onSubmit={({ name = '', startsOn = '', endsOn = '', trainers = '' }) =>
          open.mutate({ name, startsOn, endsOn, trainers: emailsIn(trainers) })
        }
      >
        <FormField
          name="name"
          label="Name of the class"
          maxLength={100}
          required
          missing="Give the class a name."
        />
        <FormField
          name="startsOn"
          label="First day"
          type="date"
          required
          missing="Choose the first day."
        />
        <FormField
          name="endsOn"
          label="Last day"
          type="date"
          required
          missing="Choose the last day."
        />
        <FormField
          name="trainers"
          label="Emails of its trainers"
          autoComplete="off"
          autoCapitalize="none"
          spellCheck={false}
          hint="With a comma between; each needs the trainer’s role."
          required
          missing="Name at least one trainer by email."
        />
        <Button type="submit" size="3" disabled={open.isPending}>
          {open.isPending ? 'Opening the class' : 'Open the class'}
        </Button>
      </Form>
      <p role="status">
        {opened && (
          <>
            {opened.name} is open. Trainees join it with the code{' '}
            <b className="mono">{opened.joinCode}</b>.
          </>
        )}
      </p>
    </section>
  );
}

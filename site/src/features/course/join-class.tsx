import { Button } from '@radix-ui/themes';
import { useMutation, useQueryClient } from '@tanstack/react-query';
import { focusOnHeading } from '../../ui/focus-on-heading.ts';
import { Form } from '../../ui/form.tsx';
import { FormField } from '../../ui/form-field.tsx';
import { courseQuery, joinClass } from './queries.ts';

/** For somebody without a class: the code from the trainer closes the isolator. */
export function JoinClass() {
  const queryClient = useQueryClient();
  const join = useMutation({
    mutationFn: joinClass,
    onSuccess: async () => {
      await queryClient.invalidateQueries({ queryKey: courseQuery.queryKey });
      focusOnHeading();
    },
  });
  return (
    <section className="join-class" aria-labelledby="join-title">
      <div>
        <h2 id="join-title">You are not in a class yet</h2>
        <p>
          Your trainer has a code for the class. With it your trainer sees how far you are and which
          worksheets to look at. You can read the sheets without it.
        </p>
      </div>
      <Form
        label="Join a class"
        problem={join.error}
        onSubmit={({ joinCode = '' }) => join.mutate(joinCode.trim())}
      >
        <FormField
          name="joinCode"
          label="Code of the class"
          className="mono"
          autoComplete="off"
          autoCapitalize="characters"
          spellCheck={false}
          maxLength={40}
          required
          missing="Type the code your trainer gave you."
        />
        <Button type="submit" size="3" disabled={join.isPending}>
          {join.isPending ? 'Joining' : 'Join the class'}
        </Button>
      </Form>
    </section>
  );
}

import { Button } from '@radix-ui/themes';
import { useMutation, useQueryClient } from '@tanstack/react-query';
import { type ReactNode } from 'react';
import { useNavigate } from 'react-router-dom';
import { ProblemCallout } from '../../ui/problem-callout.tsx';
import { attemptQuery, startAttempt } from './queries.ts';

interface StartAttemptProps {
  number: string;
  label: string;
  /** Beside the button. */
  children?: ReactNode;
}

/** Draws fresh figures, or goes on with the attempt that is open, and opens it. */
export function StartAttempt({ number, label, children }: StartAttemptProps) {
  const queryClient = useQueryClient();
  const navigate = useNavigate();
  const start = useMutation({
    mutationFn: () => startAttempt(number),
    onSuccess: async (attempt) => {
      queryClient.setQueryData(attemptQuery(attempt.id).queryKey, attempt);
      void queryClient.invalidateQueries({ queryKey: ['worksheet', number] });
      void queryClient.invalidateQueries({ queryKey: ['course'] });
      await navigate(`/worksheet-attempts/${attempt.id}`);
    },
  });
  return (
    <>
      <div className="actions">
        <Button size="3" disabled={start.isPending} onClick={() => start.mutate()}>
          {start.isPending ? 'Drawing figures' : label}
        </Button>
        {children}
      </div>
      <ProblemCallout error={start.error} />
    </>
  );
}

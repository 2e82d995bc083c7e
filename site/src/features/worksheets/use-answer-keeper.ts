import { useQueryClient } from '@tanstack/react-query';
import { useEffect, useState, useSyncExternalStore } from 'react';
import { AnswerKeeper } from './answer-keeper.ts';
import { attemptQuery, saveAnswers, type WorksheetView } from './queries.ts';

/** The answers of one attempt, kept as they are typed. */
export function useAnswerKeeper(attempt: WorksheetView) {
  const queryClient = useQueryClient();
  const [keeper] = useState(() => createKeeper(attempt));
  const kept = useSyncExternalStore(keeper.watch, keeper.read);

  useEffect(() => {
    const send = () => void keeper.flush();
    const warn = (event: BeforeUnloadEvent) => {
      if (keeper.hasUnsent) event.preventDefault();
    };
    window.addEventListener('online', send);
    window.addEventListener('pagehide', send);
    window.addEventListener('beforeunload', warn);
    return () => {
      window.removeEventListener('online', send);
      window.removeEventListener('pagehide', send);
      window.removeEventListener('beforeunload', warn);
      // Coming back must not show the answers as they were fetched; a marked paper stays.
      const { queryKey } = attemptQuery(attempt.id);
      if (queryClient.getQueryData(queryKey)?.handedInAt) return;
      void keeper.flush().then(() => queryClient.invalidateQueries({ queryKey }));
    };
  }, [keeper, attempt.id, queryClient]);
  return { keeper, kept };
}

function createKeeper({ id, items, savedAt }: WorksheetView): AnswerKeeper {
  const answers = Object.fromEntries(items.map((item) => [item.key, item.answers]));
  return new AnswerKeeper({ answers, savedAt }, (key, changed) => saveAnswers(id, key, changed));
}

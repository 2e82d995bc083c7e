import { useQueryClient } from '@tanstack/react-query';
import { useEffect, useState } from 'react';
import { type AnswerDesk } from './answer-desk.ts';
import { sittingQuery, type SittingView } from './queries.ts';

const askAgainMs = 2_000;

/** True once the time is over: what waits is sent, and the server is asked until it has closed the paper. */
export function useDeadline(sitting: SittingView, desk: AnswerDesk): boolean {
  const [isOver, setIsOver] = useState(false);
  const cache = useQueryClient();
  const { id, closesAt } = sitting;
  useEffect(() => {
    const leftMs = Date.parse(closesAt) - (Date.now() + desk.snapshot().clockOffsetMs);
    const bell = setTimeout(
      () => {
        desk.flush();
        setIsOver(true);
      },
      Math.max(0, leftMs),
    );
    return () => clearTimeout(bell);
  }, [closesAt, desk]);
  useEffect(() => {
    if (!isOver) return undefined;
    const asking = setInterval(
      () => void cache.refetchQueries({ queryKey: sittingQuery(id).queryKey }),
      askAgainMs,
    );
    return () => clearInterval(asking);
  }, [isOver, cache, id]);
  return isOver;
}

import { useEffect, useState, useSyncExternalStore } from 'react';
import { AnswerDesk } from './answer-desk.ts';
import { sendAnswer, type SittingView } from './queries.ts';

/** The desk of one sitting for as long as its pages are open. */
export function useAnswerDesk(sitting: SittingView) {
  const [desk] = useState(
    () => new AnswerDesk(sitting, (sending) => sendAnswer(sitting.id, sending)),
  );
  useEffect(() => {
    const flush = () => desk.flush();
    const online = () => desk.tryAgain();
    desk.start();
    window.addEventListener('online', online);
    document.addEventListener('visibilitychange', flush);
    return () => {
      desk.leave();
      window.removeEventListener('online', online);
      document.removeEventListener('visibilitychange', flush);
    };
  }, [desk]);
  return { desk, state: useSyncExternalStore(desk.subscribe, desk.snapshot) };
}

import { useQueryClient } from '@tanstack/react-query';
import { useEffect, useState } from 'react';
import { type ProgressView, progressQuery, saveParagraph } from './queries.ts';

const restMs = 4000;

/**
 * Keeps the furthest paragraph that was read: one in sight when four seconds are over, or when the
 * page is left. What only flies past does not count.
 */
export function useReadingProgress(number: string, progress: ProgressView): void {
  const queryClient = useQueryClient();
  // What was known when the sheet was opened; the page itself moves it on.
  const [known] = useState(progress.state === 'not-begun' ? 0 : progress.paragraph);
  useEffect(() => {
    const inSight = new Set<number>();
    let sent = known;
    let timer: ReturnType<typeof setTimeout> | undefined;
    const send = () => {
      clearTimeout(timer);
      timer = undefined;
      const furthest = Math.max(sent, ...inSight);
      if (furthest === sent) return;
      sent = furthest;
      saveParagraph(number, furthest).then(
        (kept) => {
          queryClient.setQueryData(progressQuery(number).queryKey, kept);
          void queryClient.invalidateQueries({ queryKey: ['course'], refetchType: 'none' });
        },
        // Where one was reading is not worth a message: the next paragraph tries again.
        () => {
          sent = known;
        },
      );
    };
    const observer = new IntersectionObserver(
      (entries) => {
        for (const { isIntersecting, target } of entries) {
          const paragraph = Number((target as HTMLElement).dataset['paragraph']);
          if (isIntersecting) inSight.add(paragraph);
          else inSight.delete(paragraph);
        }
        timer ??= setTimeout(send, restMs);
      },
      // A paragraph counts once it has come well up the page.
      { rootMargin: '0px 0px -35% 0px' },
    );
    document.querySelectorAll('[data-paragraph]').forEach((row) => observer.observe(row));
    document.addEventListener('visibilitychange', send);
    return () => {
      observer.disconnect();
      document.removeEventListener('visibilitychange', send);
      send();
    };
  }, [number, known, queryClient]);
}

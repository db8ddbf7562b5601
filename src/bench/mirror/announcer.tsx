import { useEffect, useState } from 'react';
import { useBenchApi } from '../../simulation/bench-context.ts';
import { announcementsFor } from './announcements.ts';

/** ms that one message stands before the next: long enough to be picked up by a screen reader */
const standing = 900;

/** The bench's one voice: a polite live region that says things one after the other. */
export const Announcer = () => {
  const bench = useBenchApi();
  const [queue, setQueue] = useState<readonly string[]>([]);

  useEffect(
    () =>
      bench.subscribe((now, before) => {
        const words = announcementsFor(before, now);
        if (words.length > 0) setQueue((waiting) => [...waiting, ...words]);
      }),
    [bench],
  );

  useEffect(() => {
    if (queue.length === 0) return undefined;
    const timer = setTimeout(() => setQueue((waiting) => waiting.slice(1)), standing);
    return () => clearTimeout(timer);
  }, [queue]);

  return (
    <p role="status" aria-live="polite" className="sr-only">
      {queue[0] ?? ''}
    </p>
  );
};

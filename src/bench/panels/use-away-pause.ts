import { useEffect } from 'react';
import type { OpenedBench } from '../../simulation/open-bench.ts';

/** Bench time stands still while nobody can see the bench; what waits is sent when the network is back. */
export function useAwayPause({ bench, outbox }: OpenedBench): void {
  useEffect(() => {
    const { clock } = bench.getState();
    const look = (): void => {
      if (document.visibilityState === 'hidden') clock.pause();
      else clock.resume();
      void outbox?.flush();
    };
    const send = (): void => void outbox?.flush();
    const warn = (event: BeforeUnloadEvent): void => {
      const { save } = bench.getState();
      // Steps kept on this device survive a closed tab; only those that the browser would not keep do not.
      if (save.kind === 'waiting' && !save.isKept) event.preventDefault();
    };
    document.addEventListener('visibilitychange', look);
    window.addEventListener('online', send);
    window.addEventListener('beforeunload', warn);
    return () => {
      document.removeEventListener('visibilitychange', look);
      window.removeEventListener('online', send);
      window.removeEventListener('beforeunload', warn);
    };
  }, [bench, outbox]);
}

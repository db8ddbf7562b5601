import { useSyncExternalStore } from 'react';

/** Whether the window is at least this wide, px. */
export function useWide(width: number): boolean {
  const query = `(min-width: ${width}px)`;
  return useSyncExternalStore(
    (changed) => {
      const list = window.matchMedia(query);
      list.addEventListener('change', changed);
      return () => list.removeEventListener('change', changed);
    },
    () => window.matchMedia(query).matches,
  );
}

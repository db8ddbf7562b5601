import { useSyncExternalStore } from 'react';

const query = '(prefers-reduced-motion: reduce)';

const subscribe = (changed: () => void): (() => void) => {
  const list = window.matchMedia(query);
  list.addEventListener('change', changed);
  return () => list.removeEventListener('change', changed);
};

/** Whether the person asked their system for less motion. */
export const useReducedMotion = (): boolean =>
  useSyncExternalStore(subscribe, () => window.matchMedia(query).matches);

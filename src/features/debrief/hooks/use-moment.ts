import { useCallback } from 'react';
import { useSearchParams } from 'react-router-dom';

/** The moment looked at: the sequence number of an event, kept in the address as `at`. */
export const useMoment = () => {
  const [search, setSearch] = useSearchParams();
  const text = search.get('at') ?? '';
  const moment = /^\d{1,9}$/.test(text) ? Number(text) : null;
  const goTo = useCallback(
    (sequence: number): void =>
      setSearch(
        (before) => {
          const next = new URLSearchParams(before);
          next.set('at', String(sequence));
          return next;
        },
        { replace: true, preventScrollReset: true },
      ),
    [setSearch],
  );
  return [moment, goTo] as const;
};

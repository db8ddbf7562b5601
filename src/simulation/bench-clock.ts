/** Bench time runs in real time while the bench is open, stands still while it is closed, and can be moved on by waiting. */
export interface BenchClock {
  now: () => number;
  skip: (ms: number) => void;
  pause: () => void;
  resume: () => void;
}

/** `startMs`: bench time of the last event on record. `realNow`: ms, monotonic. */
export function benchClock(startMs: number, realNow: () => number): BenchClock {
  let base = startMs;
  let since: number | null = realNow();
  const now = (): number => Math.round(base + (since === null ? 0 : realNow() - since));
  return {
    now,
    skip: (ms) => {
      base += ms;
    },
    pause: () => {
      base = now();
      since = null;
    },
    resume: () => {
      since ??= realNow();
    },
  };
}

/** ms of bench time for which a replay stands still at most, at 1x: a trainee who thought for ten minutes need not be watched thinking. */
export const longestPause = 4000;

/** How long the replay waits before the next event, ms of real time. */
export function pauseBefore(
  now: { benchMs: number } | undefined,
  next: { benchMs: number } | undefined,
  speed: number,
): number {
  if (!now || !next) return 0;
  return Math.min(next.benchMs - now.benchMs, longestPause) / speed;
}

import type { BenchState } from '../../shared/bench/bench-state.ts';
import type { WireEvent } from '../../shared/bench/event.ts';
import { skippedMs } from '../../shared/bench/skipped-ms.ts';

/** ms; clocks of two machines differ, and one of them may have slept. Judgement. */
const grace = 60 * 60 * 1000;

/**
 * The first event whose bench time cannot have come yet: bench time runs with the clock on the wall
 * (`elapsedMs` since the attempt was started), and only waits and runs carry it further. Null: none.
 */
export function aheadOfClock(
  { skippedMs: before }: BenchState,
  events: readonly WireEvent[],
  elapsedMs: number,
): { index: number; message: string } | null {
  let latest = elapsedMs + grace + before;
  for (const [index, event] of events.entries()) {
    latest += skippedMs(event);
    if (event.benchMs > latest) {
      return { index, message: 'Its bench time lies further ahead than time can have passed.' };
    }
  }
  return null;
}

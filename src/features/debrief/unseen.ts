import type { WireEvent } from '../../../shared/bench/event.ts';
import { runOutcome } from '../../../shared/bench/record.ts';

/** What truly happened and nobody at the bench could see; empty: nothing of the kind. */
export function unseen(event: WireEvent): string {
  const run = event.type === 'OvenRun' ? runOutcome.safeParse(event.data) : null;
  const opened = run?.success ? run.data.opened : [];
  return opened.length === 0 ? '' : `Unseen then: ${opened.join(' and ')} opened.`;
}

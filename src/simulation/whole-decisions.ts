import { actionByEvent } from '../../shared/bench/catalogue.ts';
import type { WireEvent } from '../../shared/bench/event.ts';

/**
 * Events cut into decisions: what a person did, with what it brought about. A hazard belongs to the
 * decision before it; the server judges whole decisions only, so a batch never splits one.
 */
export function wholeDecisions<E extends WireEvent>(events: readonly E[]): E[][] {
  const decisions: E[][] = [];
  for (const event of events) {
    const last = decisions.at(-1);
    if (last && !actionByEvent.has(event.type)) last.push(event);
    else decisions.push([event]);
  }
  return decisions;
}

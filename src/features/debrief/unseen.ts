import { z } from 'zod';
import type { WireEvent } from '../../../shared/bench/event.ts';
import { partRef } from '../../../shared/oven/oven.ts';

/** A run, the cord going in, the door: what made a fuse or cut-out open says so in its data. */
const openings = z.object({ opened: z.array(partRef) });

/** What truly happened and nobody at the bench could see; empty: nothing of the kind. */
export function unseen(event: WireEvent): string {
  const opened = openings.safeParse(event.data);
  return opened.success && opened.data.opened.length > 0
    ? `Unseen then: ${opened.data.opened.join(' and ')} opened.`
    : '';
}

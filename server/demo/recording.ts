import { z } from 'zod';
import { wireEvent } from '../../shared/bench/event.ts';

/** A whole attempt as the bench played it: what `npm run record-demo` writes and the demo shows. */
export const recording = z.strictObject({
  schemaVersion: z.literal(1),
  /** whose, of the demo accounts */ email: z.string(),
  /** file name in `scenarios/jobs` */ job: z.string(),
  seed: z.int(),
  events: z.array(wireEvent).min(2),
});
export type Recording = z.infer<typeof recording>;

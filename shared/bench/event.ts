import { z } from 'zod';

/** An event as it travels: what happened, at which bench time. `data` is parsed by the action or outcome of that type. */
export const wireEvent = z.strictObject({
  type: z.string().regex(/^[A-Z][A-Za-z]{2,40}$/, 'an event type'),
  version: z.literal(1),
  data: z.record(z.string(), z.unknown()),
  /** ms since the attempt began, never falling */ benchMs: z.number().min(0),
});
export type WireEvent = z.infer<typeof wireEvent>;

export const recordedEvent = wireEvent.extend({
  sequence: z.int().min(0),
  recordedAt: z.iso.datetime(),
});
export type RecordedEvent = z.infer<typeof recordedEvent>;

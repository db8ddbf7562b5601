import { z } from 'zod';
import { leadRef, partRef, terminalRef } from './oven.ts';

const point = z.tuple([z.number(), z.number()]);

/** Where everything lies on the bench seen from above, in bench units (1 unit = 1 px at zoom 1). Drawing only: no electrical meaning. */
export const ovenLayout = z.strictObject({
  schemaVersion: z.literal(1),
  oven: z.string(),
  size: point,
  chassis: z.strictObject({ at: point, size: point }),
  parts: z.record(
    partRef,
    z.strictObject({
      at: point,
      size: point,
      angle: z.number().optional(),
      label: point.optional(),
    }),
  ),
  terminals: z.record(terminalRef, z.strictObject({ at: point, label: point.optional() })),
  /** points a lead passes on its way from end a to end b, and where a lifted end hangs, relative to its terminal */
  leads: z.record(
    leadRef,
    z.strictObject({ via: z.array(point), hangs: z.tuple([point, point]).optional() }),
  ),
});

export type OvenLayout = z.infer<typeof ovenLayout>;

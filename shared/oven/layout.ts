import { z } from 'zod';
import { leadRef, partRef, terminalRef } from './oven.ts';

const point = z.tuple([z.number(), z.number()]);

/** Units of the wiring diagram from one line of its grid to the next. */
export const diagramGrid = 10;
const onGrid = z.number().nonnegative().multipleOf(diagramGrid, 'a multiple of 10');

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
  diagram: z.strictObject({
    size: z.tuple([onGrid, onGrid]),
    /** upper left corner of each part's symbol; it is turned clockwise within its box */
    parts: z.record(
      partRef,
      z.strictObject({
        at: z.tuple([onGrid, onGrid]),
        turn: z.union([z.literal(0), z.literal(90), z.literal(180), z.literal(270)]).optional(),
      }),
    ),
  }),
});

export type OvenLayout = z.infer<typeof ovenLayout>;

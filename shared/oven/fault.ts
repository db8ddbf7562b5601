import { z } from 'zod';
import { leadRef, partRef } from './oven.ts';

/** A fault that is in the oven: one change to a part (`C1`) or a lead (`W12`). `values` in SI units, by the parameter names the fault kind declares. */
export const appliedFault = z.strictObject({
  on: z.union([partRef, leadRef]),
  fault: z.string().regex(/^[a-z0-9-]+$/),
  values: z.record(z.string(), z.number()).optional(),
});
export type AppliedFault = z.infer<typeof appliedFault>;

/** What can be wrong with a part of one kind. */
export interface FaultKind {
  id: string;
  /** as it stands in a list: "shorted", "bleeder open" */ name: string;
  /** one sentence: what is wrong inside */ description: string;
  /** relative prior weight within its part kind; common practice, no source, unless said */ weight: number;
  parameters?: Readonly<
    Record<string, { name: string; unit: string; min: number; max: number; usual: number }>
  >;
  /** what inspecting the part from close shows, if it shows at all */ look?: string;
}

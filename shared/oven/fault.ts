import { z } from 'zod';
import { leadEndRef, leadRef, partRef, terminalRef } from './oven.ts';

/**
 * A fault that is in the oven: one change to a part (`C1`) or a lead (`W12`). `values` in SI units,
 * by the parameter names the fault kind declares. `other`, of a misplaced lead only: the terminal it
 * was put on or the lead end it was exchanged with; absent: the nearest.
 */
export const appliedFault = z.strictObject({
  on: z.union([partRef, leadRef]),
  fault: z.string().regex(/^[a-z0-9-]+$/),
  values: z.record(z.string(), z.number()).optional(),
  other: z.union([terminalRef, leadEndRef]).optional(),
});
export type AppliedFault = z.infer<typeof appliedFault>;

/** Where a prior weight comes from when nobody has counted: FACTS section 9 says so of all of them. */
export const judgement = 'judgement; common practice, no source';

/** What can be wrong with a part of one kind. */
export interface FaultKind {
  id: string;
  /** as it stands in a list: "shorted", "bleeder open" */ name: string;
  /** one sentence: what is wrong inside */ description: string;
  /** relative prior weight within its part kind */ weight: number;
  /** where the weight comes from */ source: string;
  parameters?: Readonly<
    Record<string, { name: string; unit: string; min: number; max: number; usual: number }>
  >;
  /** what a misplaced lead may name as the other */ other?: 'terminal' | 'lead end';
  /** what inspecting the part from close shows, if it shows at all */ look?: string;
  /** variants of the kind that can have it; absent: all */ variants?: readonly string[];
}

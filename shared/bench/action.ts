import type { z } from 'zod';
import type { Trace } from '../instruments/meter.ts';
import type { BenchState } from './bench-state.ts';
import type { HazardFound } from './hazards.ts';
import type { Setup } from './setup.ts';

/** The attempt's fixed setup and the bench at the moment of the command. */
export interface Bench {
  setup: Setup;
  /** as it is now */ state: BenchState;
  /** as the last event left it */ before: BenchState;
  /** V between the tips from then to now */ trace: Trace;
}

export interface Refusal {
  code: string;
  /** what to do or why not, second person */ message: string;
}

export type Decision<D> =
  { ok: true; data: D; hazards: readonly HazardFound[] } | { ok: false; refusal: Refusal };

/**
 * One thing a person can do on the bench: the command that asks for it, the event that says it
 * happened, and both rules. `data` is `input` plus what was judged when it happened.
 */
export interface Action<
  C extends string,
  E extends string,
  I extends z.ZodObject,
  D extends z.ZodObject,
> {
  command: C;
  event: E;
  input: I;
  data: D;
  decide: (bench: Bench, input: z.infer<I>) => Decision<z.infer<D>>;
  evolve: (state: BenchState, data: z.infer<D>, setup: Setup) => BenchState;
  /** It brings back a bench that was: what the tips meet, they had met before. */ isReturning?: true;
  /** It runs the circuit on mains, which takes a hundred to a thousand times as long as anything else. */
  runsMains?: true;
  /** for the bench log and the replay */ describe: (data: z.infer<D>) => string;
}

export const action = <
  C extends string,
  E extends string,
  I extends z.ZodObject,
  D extends z.ZodObject,
>(
  definition: Action<C, E, I, D>,
): Action<C, E, I, D> => definition;

export const accept = <D>(data: D, hazards: readonly HazardFound[] = []): Decision<D> => ({
  ok: true,
  data,
  hazards,
});

export const refuse = (code: string, message: string): { ok: false; refusal: Refusal } => ({
  ok: false,
  refusal: { code, message },
});

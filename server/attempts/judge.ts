import type { Debrief } from '../../shared/assessment/debrief.ts';
import type { BenchState } from '../../shared/bench/bench-state.ts';
import type { RecordedEvent, WireEvent } from '../../shared/bench/event.ts';
import type { Setup } from '../../shared/bench/setup.ts';
import type { Verified } from '../../shared/bench/verify.ts';
import type { OvenDefinition } from '../../shared/oven/oven.ts';
import type { ScenarioContent } from '../../shared/scenario/scenario.ts';
import type { AttemptRules } from './attempt-rules.ts';

/** The fixed side of an attempt, and what it was made from: data that can travel to another thread. */
export interface BenchSetup {
  definition: OvenDefinition;
  content: ScenarioContent;
  seed: number;
  setup: Setup;
}

export interface Begun {
  event: WireEvent;
  state: BenchState;
}

/** Does the work of the rules that costs time, wherever it is done. */
export interface Judge {
  begin: (bench: BenchSetup) => Promise<Begun>;
  verify: (bench: BenchSetup, state: BenchState, events: readonly WireEvent[]) => Promise<Verified>;
  assess: (bench: BenchSetup, events: readonly RecordedEvent[]) => Promise<Debrief>;
}

/** Judges here and now. */
export const directJudge = (rules: AttemptRules): Judge => ({
  begin: async ({ setup }) => rules.begin(setup),
  verify: async ({ setup }, state, events) => rules.verify(setup, state, events),
  assess: async ({ setup }, events) => rules.assess(setup, events),
});

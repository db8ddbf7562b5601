import { assess } from '../../shared/assessment/assess.ts';
import type { Debrief } from '../../shared/assessment/debrief.ts';
import { begin } from '../../shared/bench/begin.ts';
import type { BenchState } from '../../shared/bench/bench-state.ts';
import type { RecordedEvent, WireEvent } from '../../shared/bench/event.ts';
import { fold } from '../../shared/bench/fold.ts';
import { engineVersion, makeSetup, type Setup } from '../../shared/bench/setup.ts';
import { verify, type Verified } from '../../shared/bench/verify.ts';
import type { OvenDefinition } from '../../shared/oven/oven.ts';
import type { ScenarioContent } from '../../shared/scenario/scenario.ts';

/** What judges attempts, as the server needs it: one place that knows the bench's rules. */
export interface AttemptRules {
  /** written into every attempt; checkpoints of another version are not used */
  engineVersion: number;
  setUp: (oven: OvenDefinition, content: ScenarioContent, seed: number) => Setup;
  begin: (setup: Setup) => { event: WireEvent; state: BenchState };
  /** the bench after these events; `from` null: from the very beginning */
  fold: (setup: Setup, events: readonly WireEvent[], from: BenchState | null) => BenchState;
  verify: (setup: Setup, state: BenchState, events: readonly WireEvent[]) => Verified;
  assess: (setup: Setup, events: readonly RecordedEvent[]) => Debrief;
}

export const attemptRules: AttemptRules = {
  engineVersion,
  setUp: (definition, content, seed) =>
    makeSetup({
      definition,
      faults: content.faults,
      meter: content.meter,
      seed,
      lastRunSecondsAgo: content.lastRunSecondsAgo,
      condition: content.condition,
    }),
  begin,
  fold: (setup, events, from) => (from ? fold(setup, events, from) : fold(setup, events)),
  verify,
  assess,
};

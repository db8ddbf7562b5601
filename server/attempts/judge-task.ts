import type { Debrief } from '../../shared/assessment/debrief.ts';
import type { BenchState } from '../../shared/bench/bench-state.ts';
import type { RecordedEvent, WireEvent } from '../../shared/bench/event.ts';
import type { Verified } from '../../shared/bench/verify.ts';
import type { AttemptRules } from './attempt-rules.ts';
import type { Begun, BenchSetup } from './judge.ts';

/** Without `setup`: the other thread draws the oven again from the same seed. */
export type Pinned = Omit<BenchSetup, 'setup'>;

/** What can be asked of the judging thread. */
export type JudgeTask =
  | { kind: 'begin'; pinned: Pinned }
  | { kind: 'verify'; pinned: Pinned; state: BenchState; events: readonly WireEvent[] }
  | { kind: 'assess'; pinned: Pinned; events: readonly RecordedEvent[] };

export interface JudgeAnswers {
  begin: Begun;
  verify: Verified;
  assess: Debrief;
}

export interface Asked {
  number: number;
  task: JudgeTask;
}

export type Answered = { number: number; value: unknown } | { number: number; error: unknown };

export const pinnedOf = ({ definition, content, seed }: BenchSetup): Pinned => ({
  definition,
  content,
  seed,
});

/** Does one task with the rules. */
export function doTask(rules: AttemptRules, task: JudgeTask): JudgeAnswers[JudgeTask['kind']] {
  const { definition, content, seed } = task.pinned;
  const setup = rules.setUp(definition, content, seed);
  switch (task.kind) {
    case 'begin':
      return rules.begin(setup);
    case 'verify':
      return rules.verify(setup, task.state, task.events);
    case 'assess':
      return rules.assess(setup, task.events);
  }
}

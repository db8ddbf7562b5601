import type { Step } from '../../shared/bench/perform.ts';

/** A trainee of the demo school and what they did on a job; the bench gives the readings. */
export interface DemoAttempt {
  email: string;
  /** file name of the job in `scenarios/jobs` */ job: string;
  seed: number;
  steps: readonly Step[];
}

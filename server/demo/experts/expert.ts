import type { Step } from '../../../shared/bench/perform.ts';

/** How somebody who knows the trade finishes a job safely: written down, then done on the real bench. */
export interface Expert {
  /** file name of the job in `scenarios/jobs` */ job: string;
  seed: number;
  steps: readonly Step[];
}

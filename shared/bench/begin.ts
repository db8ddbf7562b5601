import type { BenchState } from './bench-state.ts';
import type { WireEvent } from './event.ts';
import { apply } from './run-command.ts';
import { evolve, untouched } from './fold.ts';
import { passTime } from './pass-time.ts';
import { poweredRun, standing } from './powered-run/powered-run.ts';
import type { Setup } from './setup.ts';
import { engineVersion } from './setup.ts';

/** s of the run that the customer or the colleague at site gave it last */
const lastRunSeconds = 30;

/** The first event of an attempt, and the bench it makes: the oven's last run decides what is still charged. */
export function begin(setup: Setup): { event: WireEvent; state: BenchState } {
  const { charge, opened } = whatIsLeft(setup);
  const { oven } = untouched(setup);
  const now = standing(setup.oven, { ...oven, opened });
  const event: WireEvent = {
    type: 'AttemptBegan',
    version: 1,
    data: {
      engine: engineVersion,
      seed: setup.seed,
      charge,
      ...now,
      opened: [...opened, ...(now.opened ?? [])],
    },
    benchMs: 0,
  };
  return { event, state: evolve(setup, untouched(setup), event) };
}

function whatIsLeft(setup: Setup): { charge: Record<string, number>; opened: string[] } {
  if (setup.lastRunSecondsAgo === null) return { charge: {}, opened: [] };
  const state = untouched(setup);
  const outcome = poweredRun(setup.oven, state.oven, lastRunSeconds);
  const stopped = apply(setup, state, {
    type: 'OvenRun',
    version: 1,
    data: { ...outcome },
    benchMs: 0,
  });
  const since = passTime(setup, stopped, setup.lastRunSecondsAgo * 1000).state;
  return { charge: { ...since.storage.voltages }, opened: [...since.oven.opened] };
}

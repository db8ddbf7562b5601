import { z } from 'zod';
import { accept, action, refuse } from '../action.ts';
import { beforeRun, warmthAfter } from '../cooling.ts';
import type { HazardFound } from '../hazards.ts';
import { leakageAround, leakageLimit } from '../safety/leakage.ts';
import { openAfter, poweredRun } from '../powered-run/powered-run.ts';
import type { BenchState } from '../bench-state.ts';
import type { RunOutcome } from '../record.ts';
import { runOutcome } from '../record.ts';
import { runLine } from '../run-words.ts';
import type { Setup } from '../setup.ts';

const asked = z.strictObject({ ordered: z.number().min(1).max(300) });

/** Start pressed on the control panel, or the timer turned up; the event stands at the end of the run. */
export const runOven = action({
  command: 'RunOven',
  event: 'OvenRun',
  runsMains: true,
  input: asked,
  data: runOutcome,
  decide: ({ setup, state, before }, { ordered }) => {
    if (!state.isCordIn) return refuse('cord-is-out', 'The cord is out: nothing can run.');
    const { oven, celsius } = beforeRun(before, state.benchMs - ordered * 1000);
    const outcome = poweredRun(setup.oven, oven, ordered, celsius);
    const leaks = Object.values(leakageAround(setup.oven, oven, outcome.microwavePower));
    return accept(outcome, [
      ...(state.isCoverOn ? [] : [hazardOf('mains-exposed')]),
      ...(Math.max(...leaks) > leakageLimit ? [hazardOf('microwave-leakage')] : []),
    ]);
  },
  evolve: (state, outcome, setup) => {
    const opened = openedBy(setup, state, outcome);
    return {
      ...state,
      runs: [...state.runs, outcome],
      isDisplayLit: afterRun(outcome),
      storage: { voltages: { ...outcome.charge }, currents: {} },
      oven: { ...state.oven, opened },
      ...(outcome.heat ? { warmth: warmthAfter(setup, state, outcome.heat) } : {}),
    };
  },
  describe: runLine,
});

const hazardOf = (kind: HazardFound['kind']): HazardFound => ({
  kind,
  at: null,
  to: null,
  volts: 0,
  charge: 0,
  energy: 0,
});

/** Runs from before heat was reckoned tell only what they opened. */
const openedBy = (setup: Setup, { oven }: BenchState, { heat, opened }: RunOutcome): string[] =>
  heat
    ? openAfter(setup.oven, oven.opened, opened, heat.open)
    : [...new Set([...oven.opened, ...opened])];

/** What ends a run before its time takes the display with it: a line fuse, a cut-out before the board. */
function afterRun({ isDisplayLit, opened, seconds, ordered }: RunOutcome): boolean | null {
  if (isDisplayLit === undefined) return null;
  if (!isDisplayLit || opened.length === 0) return isDisplayLit;
  return seconds >= ordered;
}

import { z } from 'zod';
import { accept, action, refuse } from '../action.ts';
import { poweredRun } from '../powered-run/powered-run.ts';
import type { BenchState } from '../bench-state.ts';
import { isDead } from '../powered-run/run-electrically.ts';
import type { RunOutcome } from '../record.ts';
import { runOutcome } from '../record.ts';
import type { Setup } from '../setup.ts';

const asked = z.strictObject({ ordered: z.number().min(1).max(300) });

/** Start pressed on the control panel, or the timer turned up; the event stands at the end of the run. */
export const runOven = action({
  command: 'RunOven',
  event: 'OvenRun',
  input: asked,
  data: runOutcome,
  decide: ({ setup, state }, { ordered }) => {
    if (!state.isCordIn) return refuse('cord-is-out', 'The cord is out: nothing can run.');
    const hazards = state.isCoverOn
      ? []
      : [{ kind: 'mains-exposed' as const, at: null, to: null, volts: 0, charge: 0, energy: 0 }];
    return accept(poweredRun(setup.oven, state.oven, ordered), hazards);
  },
  evolve: (state, outcome, setup) => ({
    ...state,
    runs: [...state.runs, outcome],
    isDisplayLit: afterRun(setup, state, outcome),
    storage: { voltages: { ...outcome.charge }, currents: {} },
    oven: {
      ...state.oven,
      opened: [...new Set([...state.oven.opened, ...outcome.opened])],
    },
  }),
  describe: (outcome) => `run for ${outcome.seconds.toFixed(1)} s: ${seenAndHeard(outcome)}`,
});

/** A blown line fuse takes the display with it; a blown high-voltage fuse does not. */
function afterRun(setup: Setup, state: BenchState, outcome: RunOutcome): boolean | null {
  if (outcome.isDisplayLit === undefined) return null;
  if (!outcome.isDisplayLit || outcome.opened.length === 0) return outcome.isDisplayLit;
  const opened = [...state.oven.opened, ...outcome.opened];
  return !isDead(setup.oven, { ...state.oven, opened });
}

const humOf = (hum: RunOutcome['hum']): string => (hum === 'none' ? 'no hum' : `${hum} hum`);

const humWords = ({ hum, atFirst }: RunOutcome): string =>
  atFirst
    ? `${humOf(atFirst.hum)} for ${atFirst.seconds.toFixed(1)} s, then ${humOf(hum)}`
    : humOf(hum);

function seenAndHeard(outcome: RunOutcome): string {
  if (outcome.isDisplayLit === false) return 'dead, no display';
  const parts = [
    outcome.isLampLit ? 'lamp on' : 'lamp dark',
    ...(outcome.isTimerRunning === undefined
      ? []
      : [outcome.isTimerRunning ? 'timer ticking' : 'timer not running']),
    humWords(outcome),
    outcome.waterRise < 0.05 ? 'water cold' : `water up ${outcome.waterRise.toFixed(1)} K`,
    ...outcome.opened.map((ref) => `${ref} opened`),
  ];
  return parts.join(', ');
}

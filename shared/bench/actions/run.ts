import { z } from 'zod';
import { accept, action, refuse } from '../action.ts';
import { beforeRun, warmthAfter } from '../cooling.ts';
import { openAfter, poweredRun } from '../powered-run/powered-run.ts';
import type { BenchState } from '../bench-state.ts';
import type { HoodOutcome, RunOutcome } from '../record.ts';
import { runOutcome } from '../record.ts';
import type { Setup } from '../setup.ts';

const asked = z.strictObject({ ordered: z.number().min(1).max(300) });

/** Start pressed on the control panel, or the timer turned up; the event stands at the end of the run. */
export const runOven = action({
  command: 'RunOven',
  event: 'OvenRun',
  input: asked,
  data: runOutcome,
  decide: ({ setup, state, before }, { ordered }) => {
    if (!state.isCordIn) return refuse('cord-is-out', 'The cord is out: nothing can run.');
    const hazards = state.isCoverOn
      ? []
      : [{ kind: 'mains-exposed' as const, at: null, to: null, volts: 0, charge: 0, energy: 0 }];
    const { oven, celsius } = beforeRun(before, state.benchMs - ordered * 1000);
    return accept(poweredRun(setup.oven, oven, ordered, celsius), hazards);
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
  describe: (outcome) => `run for ${outcome.seconds.toFixed(1)} s: ${seenAndHeard(outcome)}`,
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
    ...(outcome.hood ? [vented(outcome.hood)] : []),
  ];
  return parts.join(', ');
}

const vented = ({ isVentTurningLow, isVentTurningHigh, isLampLit }: HoodOutcome): string => {
  const speeds = [isVentTurningLow && 'low', isVentTurningHigh && 'high'].filter(Boolean);
  const vent = speeds.length === 0 ? 'vent still' : `vent on ${speeds.join(' and ')}`;
  return `${vent}, cooktop lamp ${isLampLit ? 'on' : 'dark'}`;
};

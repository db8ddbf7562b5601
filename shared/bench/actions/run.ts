import { z } from 'zod';
import { accept, action, refuse } from '../action.ts';
import { poweredRun } from '../powered-run/powered-run.ts';
import { runOutcome } from '../record.ts';

const asked = z.strictObject({ ordered: z.number().min(1).max(300) });

/** Start pressed on the control panel; the event stands at the end of the run. */
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
  evolve: (state, outcome) => ({
    ...state,
    runs: [...state.runs, outcome],
    isDisplayLit: outcome.isDisplayLit && outcome.opened.length === 0,
    storage: { voltages: { ...outcome.charge }, currents: {} },
    oven: {
      ...state.oven,
      opened: [...new Set([...state.oven.opened, ...outcome.opened])],
    },
  }),
  describe: (outcome) => `run for ${outcome.seconds.toFixed(1)} s: ${seenAndHeard(outcome)}`,
});

function seenAndHeard(outcome: z.infer<typeof runOutcome>): string {
  if (!outcome.isDisplayLit) return 'dead, no display';
  const parts = [
    outcome.isLampLit ? 'lamp on' : 'lamp dark',
    outcome.hum === 'none' ? 'no hum' : `${outcome.hum} hum`,
    outcome.waterRise < 0.05 ? 'water cold' : `water up ${outcome.waterRise.toFixed(1)} K`,
    ...outcome.opened.map((ref) => `${ref} opened`),
  ];
  return parts.join(', ');
}

import { z } from 'zod';
import { accept, action, refuse } from '../action.ts';

const nothing = z.strictObject({});
const undone = z.strictObject({
  /** type of the event that is taken back */ undone: z.string().max(40),
  /** when that was, ms of bench time */ doneAtMs: z.number(),
});

/**
 * Guided practice: after a hazard the bench goes back to how it was before the thing that brought it.
 * Bench time goes on, and the hazard stays on record.
 */
export const stepBack = action({
  command: 'StepBack',
  event: 'SteppedBack',
  input: nothing,
  data: undone,
  decide: ({ setup, state: { wayBack } }) => {
    if (!setup.mayStepBack) {
      return refuse('no-way-back', 'Only guided practice lets you step back.');
    }
    return wayBack?.isOffered
      ? accept({ undone: wayBack.done, doneAtMs: wayBack.atMs })
      : refuse('nothing-to-undo', 'You can step back only right after a hazard.');
  },
  evolve: (state) =>
    state.wayBack
      ? {
          ...state.wayBack.before,
          benchMs: state.benchMs,
          skippedMs: state.skippedMs,
          hazards: state.hazards,
          wayBack: null,
        }
      : state,
  isReturning: true,
  describe: () => 'stepped back to before the hazard',
});

import type { Hand, Tapped, Tool } from './tool.ts';
import { emptyHand } from './tool.ts';

type ClipHand = Extract<Hand, { kind: 'discharge-clip' }>;
type TipHand = Extract<Hand, { kind: 'discharge-tip' }>;

/** The crocodile clip of the discharge lead; its tip follows in the hand. */
export const dischargeClip: Tool<ClipHand> = {
  name: () => 'clip of the discharge lead',
  hint: () => 'Tap where the clip goes: bare chassis first.',
  tap: (_hand, target) => ({
    command: { type: 'FitDischargeClip', data: { target } },
    hand: { kind: 'discharge-tip' },
  }),
};

/** The insulated tip, held on a terminal until it is moved or put down. It stays in the hand. */
export const dischargeTip: Tool<TipHand> = {
  name: () => 'tip of the discharge lead',
  hint: (_hand, state) =>
    state.discharge.clip === null
      ? 'The clip is on nothing: the tip alone discharges nothing.'
      : 'Tap a terminal and hold for a few seconds, then the next one.',
  tap: (hand, target, state): Tapped =>
    state.discharge.tip === target
      ? { command: { type: 'LiftDischargeTip', data: {} }, hand: emptyHand }
      : { command: { type: 'TouchDischargeTip', data: { target } }, hand },
};

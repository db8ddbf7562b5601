import type { Hand, Tool } from './tool.ts';
import { emptyHand } from './tool.ts';

type BladeHand = Extract<Hand, { kind: 'screwdriver' }>;

/** The insulated screwdriver bridges two places with its blade. */
export const screwdriver: Tool<BladeHand> = {
  name: () => 'insulated screwdriver',
  hint: (hand) =>
    hand.from === null
      ? 'Tap the first place the blade touches.'
      : `Tap the second place: the blade will bridge it with ${hand.from}.`,
  tap: (hand, target) =>
    hand.from === null
      ? { command: null, hand: { kind: 'screwdriver', from: target } }
      : {
          command: { type: 'ShortWithScrewdriver', data: { from: hand.from, to: target } },
          hand: emptyHand,
        },
};

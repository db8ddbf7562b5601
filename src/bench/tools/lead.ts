import type { Hand, Tool } from './tool.ts';
import { emptyHand } from './tool.ts';

type LeadHand = Extract<Hand, { kind: 'lead' }>;

/** A lifted lead end on its way to a terminal: the right one or a wrong one. */
export const lead: Tool<LeadHand> = {
  name: (hand) => `lead end ${hand.end}`,
  hint: (hand) => `Tap the terminal to fit ${hand.end} on.`,
  tap: (hand, target) => ({
    command: { type: 'RefitLead', data: { end: hand.end, terminal: target } },
    hand: emptyHand,
  }),
};

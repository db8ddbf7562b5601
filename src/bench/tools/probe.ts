import type { Hand, Tool } from './tool.ts';
import { emptyHand } from './tool.ts';

type ProbeHand = Extract<Hand, { kind: 'probe' }>;

/** Places a test probe; while the other one lies idle, it is in the hand next. */
export const probe: Tool<ProbeHand> = {
  name: (hand) => `${hand.probe} probe`,
  hint: (hand) => `Tap the terminal for the ${hand.probe} probe.`,
  tap: (hand, target, state) => {
    const other = hand.probe === 'red' ? 'black' : 'red';
    return {
      command: { type: 'PlaceProbe', data: { probe: hand.probe, target } },
      hand: state.probes[other] === null ? { kind: 'probe', probe: other } : emptyHand,
    };
  },
};

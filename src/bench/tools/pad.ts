import type { Hand, Tool } from './tool.ts';
import { emptyHand } from './tool.ts';

/** The abrasive pad: takes the varnish off a spot of the core. */
export const pad: Tool<Extract<Hand, { kind: 'pad' }>> = {
  name: () => 'abrasive pad',
  hint: () => 'Tap a varnished spot to clean it to bare metal.',
  tap: (_hand, target) => ({
    command: { type: 'CleanSpot', data: { terminal: target } },
    hand: emptyHand,
  }),
};

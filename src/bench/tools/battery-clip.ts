import type { Hand, Tool } from './tool.ts';
import { emptyHand } from './tool.ts';

type BatteryHand = Extract<Hand, { kind: 'battery-clip' }>;

/** One of the battery's two leads; the other one follows while it lies idle. */
export const batteryClip: Tool<BatteryHand> = {
  name: (hand) => (hand.clip === 'neg' ? 'battery negative clip' : 'battery 1 kΩ clip'),
  hint: (hand) =>
    hand.clip === 'neg'
      ? 'Tap where the negative of the battery goes.'
      : 'Tap where the positive goes, through 1 kΩ.',
  tap: (hand, target, state) => {
    const other = hand.clip === 'neg' ? 'oneK' : 'neg';
    return {
      command: { type: 'ClipBattery', data: { clip: hand.clip, target } },
      hand: state.battery[other] === null ? { kind: 'battery-clip', clip: other } : emptyHand,
    };
  },
};

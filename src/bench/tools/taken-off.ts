import type { BenchCommand } from '../../../shared/bench/catalogue.ts';
import type { BenchState } from '../../../shared/bench/bench-state.ts';
import type { Hand } from './tool.ts';

/** What comes off its place when this is taken into the hand; null: it lies free. */
export function takenOff(hand: Hand, state: BenchState): BenchCommand | null {
  switch (hand.kind) {
    case 'probe':
      return state.probes[hand.probe] ? { type: 'RemoveProbe', data: { probe: hand.probe } } : null;
    case 'discharge-clip':
      return state.discharge.clip ? { type: 'RemoveDischargeClip', data: {} } : null;
    case 'discharge-tip':
      return state.discharge.tip ? { type: 'LiftDischargeTip', data: {} } : null;
    case 'battery-clip':
      return state.battery[hand.clip] ? { type: 'UnclipBattery', data: { clip: hand.clip } } : null;
    case 'empty':
    case 'lead':
    case 'label':
    case 'pad':
    case 'screwdriver':
      return null;
  }
}

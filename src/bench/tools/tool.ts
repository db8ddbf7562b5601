import type { BenchCommand } from '../../../shared/bench/catalogue.ts';
import type { BenchState } from '../../../shared/bench/bench-state.ts';

/** What the hand holds. One thing at a time; Escape puts it down. */
export type Hand =
  | { kind: 'empty' }
  | { kind: 'probe'; probe: 'red' | 'black' }
  | { kind: 'discharge-clip' }
  | { kind: 'discharge-tip' }
  | { kind: 'battery-clip'; clip: 'neg' | 'oneK' }
  | { kind: 'lead'; end: string }
  | { kind: 'label' }
  | { kind: 'pad' }
  | { kind: 'screwdriver'; from: string | null };

export const emptyHand: Hand = { kind: 'empty' };

/** What a tap on a target does: a command for the bench, and what the hand holds after it went well. */
export interface Tapped {
  command: BenchCommand | null;
  hand: Hand;
}

/** The headless half of a tool: what it is called, and what it does to the target that is tapped. */
export interface Tool<H extends Hand = Hand> {
  /** in the hand, in words: "red probe" */ name: (hand: H) => string;
  /** what to do next, one sentence */ hint: (hand: H, state: BenchState) => string;
  tap: (hand: H, target: string, state: BenchState) => Tapped;
}

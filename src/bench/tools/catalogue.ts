import type { BenchState } from '../../../shared/bench/bench-state.ts';
import { batteryClip } from './battery-clip.ts';
import { dischargeClip, dischargeTip } from './discharge-lead.ts';
import { label } from './label.ts';
import { lead } from './lead.ts';
import { pad } from './pad.ts';
import { probe } from './probe.ts';
import { screwdriver } from './screwdriver.ts';
import type { Hand, Tapped, Tool } from './tool.ts';

type ToolOf<K extends Hand['kind']> = Tool<Extract<Hand, { kind: K }>>;

/** Every tool that a hand can hold; a new one is one file and one line. */
const tools: { [K in Exclude<Hand['kind'], 'empty'>]: ToolOf<K> } = {
  probe,
  'discharge-clip': dischargeClip,
  'discharge-tip': dischargeTip,
  'battery-clip': batteryClip,
  lead,
  label,
  pad,
  screwdriver,
};

const toolOf = (hand: Hand): Tool | null =>
  hand.kind === 'empty' ? null : (tools[hand.kind] as unknown as Tool);

export const nameOfHand = (hand: Hand): string => toolOf(hand)?.name(hand) ?? 'nothing';

export const hintForHand = (hand: Hand, state: BenchState): string =>
  toolOf(hand)?.hint(hand, state) ?? 'Tap a terminal, a lead or a part to see what you can do.';

/** Null when the hand is empty: the tap selects what it met. */
export const tapWith = (hand: Hand, target: string, state: BenchState): Tapped | null =>
  toolOf(hand)?.tap(hand, target, state) ?? null;

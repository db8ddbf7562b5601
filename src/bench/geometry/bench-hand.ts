import type { ProbeHold } from '../../../shared/bench/record.ts';
import type { LeadEndRef, PartRef, TargetRef } from '../../../shared/oven/oven.ts';
import type { BenchPoint } from './bench-point.ts';
import type { ProbeColour } from './bench-scene.ts';

/** What the hand and the tools do, what is under the hand, and what the oven shows: all of the picture that the oven's circuit does not decide. */
export interface BenchHand {
  isCoverOn: boolean;
  isCordIn: boolean;
  probes: Readonly<Record<ProbeColour, TargetRef | null>>;
  holds: Readonly<Record<ProbeColour, ProbeHold>>;
  discharge: { clip: TargetRef | null; tip: TargetRef | null };
  battery: { neg: TargetRef | null; oneK: TargetRef | null };
  labels: Readonly<Record<LeadEndRef, string>>;
  /** what the hand carries now */
  carrying:
    | null
    | { tool: 'probe'; colour: ProbeColour }
    | { tool: 'discharge'; end: 'clip' | 'tip' }
    | { tool: 'battery'; end: 'neg' | 'oneK' };
  handAt: BenchPoint | null;
  /** a target, lead or part */ hovered: string | null;
  /** a target, lead or part with the keyboard's focus */ focused: string | null;
  /** by part: what can be seen on it from close */
  looks: Readonly<Record<PartRef, readonly string[]>>;
  /** by part: what is printed on it, line by line */
  stamps: Readonly<Record<PartRef, readonly string[]>>;
  lit: readonly PartRef[];
  turning: readonly PartRef[];
  replaced: readonly PartRef[];
  hazardFlash: TargetRef | null;
}

/** Nothing in hand, nothing connected, cord out and cover off. */
export const emptyHand: BenchHand = {
  isCoverOn: false,
  isCordIn: false,
  probes: { red: null, black: null },
  holds: { red: 'handle', black: 'handle' },
  discharge: { clip: null, tip: null },
  battery: { neg: null, oneK: null },
  labels: {},
  carrying: null,
  handAt: null,
  hovered: null,
  focused: null,
  looks: {},
  stamps: {},
  lit: [],
  turning: [],
  replaced: [],
  hazardFlash: null,
};

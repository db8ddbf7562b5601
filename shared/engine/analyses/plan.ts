import { waveCorners, waveStepLimit } from '../circuit/wave-value.ts';
import type { Machine } from './machine.ts';

/** Where to go and how carefully. Times in s, on the sources' clock. */
export interface Plan {
  readonly from: number;
  readonly to: number;
  /** moments at which something jumps that the sources do not know of */
  readonly breaks: readonly number[];
  /** every multiple of this is landed on; 0 for none */ readonly grid: number;
  readonly maxStep: number;
  /**
   * Share of the time since the last break below which no step is forced, for the sake of rings that
   * nobody will see: they are then damped, charge and flux being kept. 0 to follow everything.
   */
  readonly patience: number;
  /** of each capacitor's voltage and inductor's current, in one step */
  readonly relativeTolerance: number;
}

/** Ends of the stretches within which nothing jumps, the plan's end last; empty when no time passes. */
export function segmentEnds({ sources }: Machine, plan: Plan): number[] {
  const { from, to } = plan;
  const inside = plan.breaks.filter((time) => time > from && time < to);
  for (const { element, fixed } of sources) {
    if (fixed === undefined) inside.push(...waveCorners(element.wave, from, to));
  }
  inside.sort((p, q) => p - q);
  const ends: number[] = [];
  let last = from;
  for (const time of [...inside, to]) {
    // corners that rounding alone keeps apart are one
    if (time - last <= 1e-12 * Math.abs(time)) {
      if (ends.length > 0) ends[ends.length - 1] = last = time;
      continue;
    }
    ends.push(time);
    last = time;
  }
  return ends;
}

/** Offset from `base` of the next place a step must end, in a segment of `length` s. */
export function landing(plan: Plan, base: number, length: number, offset: number): number {
  if (plan.grid <= 0) return length;
  const next = Math.floor((base + offset) / plan.grid + 1 + 1e-6) * plan.grid;
  return Math.min(length, next - base);
}

/** s; what the plan and the sources' own waves allow. */
export function longestStep({ sources }: Machine, plan: Plan): number {
  let longest = plan.maxStep;
  for (const { element, fixed } of sources) {
    if (fixed === undefined) longest = Math.min(longest, waveStepLimit(element.wave));
  }
  return longest;
}

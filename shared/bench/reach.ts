import { targetsOf } from '../oven/targets.ts';
import type { TargetRef } from '../oven/oven.ts';
import type { Bench } from './action.ts';
import { refuse } from './action.ts';
import type { BenchState } from './bench-state.ts';
import type { Setup } from './setup.ts';

const coverOn = refuse('cover-is-on', 'The cover is on. Take it off first.');

/** A refusal when the inside of the oven cannot be reached; null when it can. */
export const insideRefusal = ({ state }: Bench): typeof coverOn | null =>
  state.isCoverOn ? coverOn : null;

/** A refusal when a probe, clip or tip cannot get to this target now; null when it can. */
export function targetRefusal(
  { setup, state }: Bench,
  target: TargetRef,
): ReturnType<typeof refuse> | null {
  if (!targetsOf(setup.oven.definition, state.oven).includes(target)) {
    return refuse('no-such-target', `There is no bare metal at ${target} to touch.`);
  }
  return isReachable(setup, state, target) ? null : coverOn;
}

/** Plug pins and the bench's own tools lie outside the cover; with the cord in, the pins are in the outlet. */
export function isReachable(setup: Setup, state: BenchState, target: TargetRef): boolean {
  if (target.startsWith('BAT.')) return true;
  const ref = target.split(/[./]/)[0] ?? '';
  const part = setup.oven.definition.parts.find((one) => one.ref === ref);
  if (part?.isOutside) return !state.isCordIn;
  return !state.isCoverOn;
}

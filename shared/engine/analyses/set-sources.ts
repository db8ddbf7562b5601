import { waveValue } from '../circuit/wave-value.ts';
import { addCurrentSource } from '../devices/current-source.ts';
import type { Machine, SourceState } from './machine.ts';

/**
 * A moment to take the sources at: `rest` takes each source's own direct value, `start` its wave as it
 * stands before t = 0, a number its wave at that time (s), from the side given where it jumps.
 */
export type Moment = number | 'rest' | 'start';

/** Sets every source to its value at a moment, times `factor`. */
export function setSources(
  machine: Machine,
  moment: Moment,
  factor: number = 1,
  side: -1 | 1 = 1,
): void {
  const { system, sources } = machine;
  system.injected.fill(0);
  for (let at = 0; at < sources.length; at += 1) {
    const source = sources[at]!;
    const value = factor * valueAt(source, moment, side);
    if (source.branch >= 0) system.rho[source.branch] = value;
    else if (source.element.kind === 'current-source') {
      addCurrentSource(system, source.element, value);
    }
  }
}

function valueAt({ element, fixed }: SourceState, moment: Moment, side: -1 | 1): number {
  if (fixed !== undefined) return fixed;
  if (typeof moment === 'number') return waveValue(element.wave, moment, side);
  const before = waveValue(element.wave, 0, -1);
  return moment === 'rest' ? (element.dc ?? before) : before;
}

import { waveSlope } from '../circuit/wave-slope.ts';
import { addCurrentSource } from '../devices/current-source.ts';
import type { System } from '../stamping/system.ts';
import type { Machine } from './machine.ts';

/** Writes the rate of change of every source into a system of rates; `rho` is cleared before. */
export function setSourceSlopes(
  machine: Machine,
  system: System,
  time: number,
  side: -1 | 1,
): void {
  system.injected.fill(0);
  for (const { element, branch, fixed } of machine.sources) {
    const slope = fixed === undefined ? waveSlope(element.wave, time, side) : 0;
    if (branch >= 0) system.rho[branch] = slope;
    else if (element.kind === 'current-source') addCurrentSource(system, element, slope);
  }
}

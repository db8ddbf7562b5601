import { restingValue } from '../circuit/loops-and-islands.ts';
import { waveValue } from '../circuit/wave-value.ts';
import { addCurrentSource } from '../devices/current-source.ts';
import type { System } from '../stamping/system.ts';

/** Sets every source to its value at a time (s), times `factor`; 'rest' takes the direct value. */
export function setSources(
  system: System,
  time: number | 'rest',
  factor = 1,
  side: -1 | 1 = 1,
): void {
  const { netlist, rho, injected } = system;
  const { branches, currentSources } = netlist;
  for (let k = 0; k < branches.length; k += 1) {
    const element = branches[k]!;
    if (element.kind !== 'voltage-source') continue;
    rho[k] =
      factor * (time === 'rest' ? restingValue(element) : waveValue(element.wave, time, side));
  }
  if (currentSources.length === 0) return;
  injected.fill(0);
  for (const source of currentSources) {
    const value = time === 'rest' ? restingValue(source) : waveValue(source.wave, time, side);
    addCurrentSource(system, source, factor * value);
  }
}

import type { Storage } from '../engine/circuit/circuit.ts';
import type { BenchState } from './bench-state.ts';
import { solveLive } from './live-volts.ts';
import { circuitOf } from './pass-time.ts';
import type { Setup } from './setup.ts';
import { cos, sin } from '../engine/elementary/sine.ts';

/** Capacitors on the mains keep the voltage of the instant at which the cord was pulled: bench time decides the phase. */
export function chargeAtUnplugging(setup: Setup, state: BenchState): Storage {
  const solved = solveLive(setup, state);
  if (!solved) return state.storage;
  const angle = 2 * Math.PI * setup.oven.definition.supply.hertz * (state.benchMs / 1000);
  const voltages: Record<string, number> = { ...state.storage.voltages };
  for (const element of circuitOf(setup, state).elements) {
    if (element.kind !== 'capacitor') continue;
    const [a, b] = element.nodes.map(solved);
    if (!a || !b) continue;
    const [re, im] = [a[0] - b[0], a[1] - b[1]];
    const mains = Math.SQRT2 * (re * cos(angle) - im * sin(angle));
    voltages[element.name] = (voltages[element.name] ?? 0) + mains;
  }
  return { voltages, currents: {} };
}

import { setResistiveBranch } from '../stamping/branch-equation.ts';
import type { System } from '../stamping/system.ts';

/** V = R I in every analysis; R in Ohm, above zero. Source: Ohm's law. */
export function stampResistor(system: System, k: number, resistance: number): void {
  setResistiveBranch(system, k, resistance, 0);
}

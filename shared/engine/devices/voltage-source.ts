import type { System } from '../stamping/system.ts';
import { setResistiveBranch } from '../stamping/branch-equation.ts';

/**
 * V_from - V_to = E (V). Its current counts positive into the + node (`from`), through the source,
 * to the - node, so a source that delivers power has a negative current, as SPICE counts it.
 */
export function stampVoltageSource(system: System, k: number, volts: number): void {
  setResistiveBranch(system, k, 0, volts);
}

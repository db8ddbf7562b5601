import { setResistiveBranch } from '../stamping/branch-equation.ts';
import { REFERENCE, type System } from '../stamping/system.ts';

/**
 * V_from - V_to = R I + d(flux)/dt, flux = L I + sum of M I of the coupled windings (V s).
 * At rest: V = R I. In an implicit stage of length d = h gamma, with F* the flux the earlier stages
 * give: V = R I + (flux - F*) / d.
 */
export function stampInductorAtRest(system: System, k: number, resistance: number): void {
  setResistiveBranch(system, k, resistance, 0);
}

/** The coefficients of a stage; `inductance` H, `resistance` Ohm, `length` s. */
export function stampInductorStage(
  system: System,
  k: number,
  inductance: number,
  resistance: number,
  length: number,
): void {
  setResistiveBranch(system, k, resistance + inductance / length, 0);
}

/** The right-hand side of a stage: F* in V s. */
export function setInductorHistory(system: System, k: number, flux: number, length: number): void {
  system.rho[k] = (-system.alpha[k]! * flux) / length;
}

/** d(flux)/dt, V, from the solved voltages and current. */
export function inductorRate(system: System, k: number, resistance: number): number {
  const { from, to, nodeCount } = system.netlist;
  const { x } = system;
  return x[from[k]!]! - x[to[k]!]! - (resistance * x[nodeCount + k]!) / REFERENCE;
}

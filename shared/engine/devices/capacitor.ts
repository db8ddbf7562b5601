import { setConductiveBranch, setResistiveBranch } from '../stamping/branch-equation.ts';
import { REFERENCE, type System } from '../stamping/system.ts';

/**
 * I = C dV/dt, positive from `from` to `to`.
 * At rest: open, I = 0. In an implicit stage of length d = h gamma, with V* the voltage the earlier
 * stages give: I = (C / d)(V - V*).
 */
export function stampCapacitorAtRest(system: System, k: number): void {
  setConductiveBranch(system, k, 0, 0);
}

/** The coefficients of a stage; `capacitance` F, `length` s. */
export function stampCapacitorStage(
  system: System,
  k: number,
  capacitance: number,
  length: number,
): void {
  setResistiveBranch(system, k, length / capacitance, 0);
}

/** The right-hand side of a stage: V* in V. */
export function setCapacitorHistory(system: System, k: number, volts: number): void {
  system.rho[k] = system.alpha[k]! * volts;
}

/** dV/dt, V/s, from the solved current. */
export function capacitorRate(system: System, k: number, capacitance: number): number {
  return system.x[system.netlist.nodeCount + k]! / (REFERENCE * capacitance);
}

import type { Coupled } from '../circuit/netlist.ts';
import { setMutual } from '../stamping/branch-equation.ts';
import { REFERENCE, type System } from '../stamping/system.ts';

/** M = k sqrt(L1 L2), H; the dots are at the first nodes of both windings. */
export function mutualInductance(coefficient: number, first: number, second: number): number {
  return coefficient * Math.sqrt(first * second);
}

/** At rest no winding drives another. */
export function stampCouplingAtRest(system: System, c: number): void {
  setMutual(system, c, 0, 0);
  setMutual(system, c, 1, 0);
}

/** M / d in the row of each winding, scaled as that row was: call after both inductors are stamped. */
export function stampCouplingStage(
  system: System,
  c: number,
  coupled: Coupled,
  mutual: number,
  length: number,
): void {
  const scaled = mutual / (length * REFERENCE);
  setMutual(system, c, 0, scaled * system.alpha[coupled.first]!);
  setMutual(system, c, 1, scaled * system.alpha[coupled.second]!);
}

import { computeResidual } from '../stamping/residual.ts';
import { currentLawError } from './newton.ts';
import type { Machine } from './machine.ts';

/**
 * The largest error of Kirchhoff's current law in a machine's present solution, over all nodes, as
 * a share of the largest current at that node. Every current is an unknown of the solution, so no
 * digits are lost to voltage differences.
 */
export function kclResidual(machine: Machine): number {
  computeResidual(machine.system);
  return currentLawError(machine);
}

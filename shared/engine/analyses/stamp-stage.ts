import { stampCapacitorStage } from '../devices/capacitor.ts';
import { stampCouplingStage } from '../devices/coupling.ts';
import { stampInductorStage } from '../devices/inductor.ts';
import type { System } from '../stamping/system.ts';
import type { Machine } from './machine.ts';

/** Writes capacitors, inductors and couplings for an implicit stage of `length` (h gamma, s). */
export function stampStage(system: System, machine: Machine, length: number): void {
  const { capacitors, inductors, mutuals, netlist } = machine;
  for (let at = 0; at < capacitors.length; at += 1) {
    const { branch, value } = capacitors[at]!;
    stampCapacitorStage(system, branch, value, length);
  }
  for (let at = 0; at < inductors.length; at += 1) {
    const { branch, value, resistance } = inductors[at]!;
    stampInductorStage(system, branch, value, resistance, length);
  }
  for (let c = 0; c < mutuals.length; c += 1) {
    stampCouplingStage(system, c, netlist.coupled[c]!, mutuals[c]!, length);
  }
}

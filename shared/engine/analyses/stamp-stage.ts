import { stampCapacitorStage } from '../devices/capacitor.ts';
import { stampCouplingStage } from '../devices/coupling.ts';
import { stampInductorStage } from '../devices/inductor.ts';
import type { Coupled } from '../circuit/netlist.ts';
import type { System } from '../stamping/system.ts';

interface Parts {
  readonly netlist: { readonly coupled: readonly Coupled[] };
  readonly capacitors: readonly { readonly branch: number; readonly value: number }[];
  readonly inductors: readonly {
    readonly branch: number;
    readonly value: number;
    readonly resistance: number;
  }[];
  readonly mutuals: Float64Array;
}

/** Writes capacitors, inductors and couplings for an implicit stage of `length` (h gamma, s). */
export function stampStage(system: System, parts: Parts, length: number): void {
  const { capacitors, inductors, mutuals, netlist } = parts;
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

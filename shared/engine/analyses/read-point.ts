import type { OperatingPoint } from '../circuit/circuit.ts';
import { REFERENCE } from '../stamping/system.ts';
import type { Machine } from './machine.ts';

/** The machine's present solution in V and A, by name. */
export function readPoint({ netlist, system }: Machine): OperatingPoint {
  const voltages: Record<string, number> = { '0': 0 };
  const currents: Record<string, number> = {};
  netlist.nodeNames.forEach((name, node) => (voltages[name] = system.x[node]!));
  netlist.branches.forEach(({ name }, k) => {
    currents[name] = system.x[netlist.nodeCount + k]! / REFERENCE;
  });
  return { voltages, currents };
}

import { REFERENCE } from '../stamping/system.ts';
import type { Machine } from './machine.ts';

/** A through an inductor in the machine's present solution. */
export function inductorCurrent({ system, netlist, inductors }: Machine, j: number): number {
  return system.x[netlist.nodeCount + inductors[j]!.branch]! / REFERENCE;
}

import type { Circuit, Element } from './circuit.ts';
import { topologyOf, type Topology } from './topology.ts';

export type Branch = Exclude<Element, { kind: 'coupling' | 'current-source' }>;
export type CurrentSource = Extract<Element, { kind: 'current-source' }>;

/** Two inductors coupled: the branches that hold them, and k. */
export interface Coupled {
  readonly first: number;
  readonly second: number;
  readonly coefficient: number;
}

/** A circuit's topology with the elements that stand in it. */
export interface Netlist extends Topology {
  readonly topology: Topology;
  readonly branches: readonly Branch[];
  readonly coupled: readonly Coupled[];
  readonly currentSources: readonly CurrentSource[];
}

/** Numbers the nodes and branches of a circuit already found sound. */
export function buildNetlist(circuit: Circuit): Netlist {
  const topology = topologyOf(circuit);
  const branches: Branch[] = [];
  const coupled: Coupled[] = [];
  const currentSources: CurrentSource[] = [];
  for (const element of circuit.elements) {
    if (element.kind === 'coupling') {
      const at = 2 * coupled.length;
      coupled.push({
        first: topology.coupledBranches[at]!,
        second: topology.coupledBranches[at + 1]!,
        coefficient: element.coefficient,
      });
    } else if (element.kind === 'current-source') currentSources.push(element);
    else branches.push(element);
  }
  return { ...topology, topology, branches, coupled, currentSources };
}

import type { Circuit, Element } from './circuit.ts';

export type Branch = Exclude<Element, { kind: 'coupling' | 'current-source' }>;
export type CurrentSource = Extract<Element, { kind: 'current-source' }>;

/** Two inductors coupled: the branches that hold them, and k. */
export interface Coupled {
  readonly name: string;
  readonly first: number;
  readonly second: number;
  readonly coefficient: number;
}

/**
 * A circuit as index arrays. Unknown i < nodeCount is the voltage of node i; unknown nodeCount + k
 * is the current of branch k; the last index, `size`, stands for ground and stays zero.
 * Every element but couplings and current sources is a branch with its own current.
 */
export interface Netlist {
  readonly nodeNames: readonly string[];
  readonly nodeIndex: ReadonlyMap<string, number>;
  readonly nodeCount: number;
  readonly branches: readonly Branch[];
  readonly branchIndex: ReadonlyMap<string, number>;
  readonly size: number;
  readonly from: Int32Array;
  readonly to: Int32Array;
  readonly coupled: readonly Coupled[];
  readonly currentSources: readonly CurrentSource[];
}

/** Numbers the nodes and branches of a circuit already found sound. */
export function buildNetlist(circuit: Circuit): Netlist {
  const nodeNames: string[] = [];
  const nodeIndex = new Map<string, number>();
  const number = (node: string): void => {
    if (node === '0' || nodeIndex.has(node)) return;
    nodeIndex.set(node, nodeNames.length);
    nodeNames.push(node);
  };
  const branches: Branch[] = [];
  const branchIndex = new Map<string, number>();
  const currentSources: CurrentSource[] = [];
  for (const element of circuit.elements) {
    if (element.kind === 'coupling') continue;
    element.nodes.forEach(number);
    if (element.kind === 'switch') element.control.forEach(number);
    if (element.kind === 'current-source') currentSources.push(element);
    else {
      branchIndex.set(element.name, branches.length);
      branches.push(element);
    }
  }
  const size = nodeNames.length + branches.length;
  nodeIndex.set('0', size);
  const end = (which: 0 | 1) =>
    Int32Array.from(branches, (branch) => nodeIndex.get(branch.nodes[which])!);
  return {
    nodeNames,
    nodeIndex,
    nodeCount: nodeNames.length,
    branches,
    branchIndex,
    size,
    from: end(0),
    to: end(1),
    coupled: findCoupled(circuit, branchIndex),
    currentSources,
  };
}

function findCoupled(circuit: Circuit, branchIndex: ReadonlyMap<string, number>): Coupled[] {
  return circuit.elements
    .filter((element) => element.kind === 'coupling')
    .map(({ name, inductors, coefficient }) => ({
      name,
      first: branchIndex.get(inductors[0])!,
      second: branchIndex.get(inductors[1])!,
      coefficient,
    }));
}

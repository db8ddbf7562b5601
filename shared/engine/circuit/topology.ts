import type { Circuit } from './circuit.ts';

/**
 * How a circuit is joined, without its values, as index arrays. Unknown i < nodeCount is the voltage
 * of node i; unknown nodeCount + k the current of branch k; the last index, `size`, stands for
 * ground and stays zero. Every element but couplings and current sources is a branch.
 */
export interface Topology {
  readonly nodeNames: readonly string[];
  readonly nodeIndex: ReadonlyMap<string, number>;
  readonly nodeCount: number;
  readonly branchIndex: ReadonlyMap<string, number>;
  readonly branchCount: number;
  readonly size: number;
  readonly from: Int32Array;
  readonly to: Int32Array;
  /** branches of both inductors of each coupling, in turn */ readonly coupledBranches: Int32Array;
  /** whether a branch may be imaginary at a frequency */ readonly isReactive: readonly boolean[];
}

/** Topologies met lately: one oven is solved thousands of times with other values. */
const known = new Map<string, Topology>();
const KEPT = 256;

/** The topology of a sound circuit; the same object for every circuit joined the same way. */
export function topologyOf(circuit: Circuit): Topology {
  const key = keyOf(circuit);
  const met = known.get(key);
  if (met !== undefined) return met;
  const topology = findTopology(circuit);
  known.set(key, topology);
  if (known.size > KEPT) known.delete(known.keys().next().value!);
  return topology;
}

/** Names may hold any character but are told apart by their lengths. */
function keyOf({ elements }: Circuit): string {
  let key = '';
  for (const element of elements) {
    const ends = element.kind === 'coupling' ? element.inductors : element.nodes;
    key += `${element.kind} ${element.name.length} ${element.name}${ends[0].length} ${ends[0]}${ends[1].length} ${ends[1]}`;
    if (element.kind === 'switch') {
      const [a, b] = element.control;
      key += `${a.length} ${a}${b.length} ${b}`;
    }
  }
  return key;
}

function findTopology({ elements }: Circuit): Topology {
  const nodeNames: string[] = [];
  const nodeIndex = new Map<string, number>();
  const number = (node: string): void => {
    if (node === '0' || nodeIndex.has(node)) return;
    nodeIndex.set(node, nodeNames.length);
    nodeNames.push(node);
  };
  const branchIndex = new Map<string, number>();
  const ends: (readonly [string, string])[] = [];
  const isReactive: boolean[] = [];
  for (const element of elements) {
    if (element.kind === 'coupling') continue;
    element.nodes.forEach(number);
    if (element.kind === 'switch') element.control.forEach(number);
    if (element.kind === 'current-source') continue;
    branchIndex.set(element.name, ends.length);
    ends.push(element.nodes);
    isReactive.push(element.kind === 'capacitor' || element.kind === 'inductor');
  }
  const size = nodeNames.length + ends.length;
  nodeIndex.set('0', size);
  return {
    nodeNames,
    nodeIndex,
    nodeCount: nodeNames.length,
    branchIndex,
    branchCount: ends.length,
    size,
    from: Int32Array.from(ends, ([from]) => nodeIndex.get(from)!),
    to: Int32Array.from(ends, ([, to]) => nodeIndex.get(to)!),
    coupledBranches: Int32Array.from(
      elements.flatMap((element) =>
        element.kind === 'coupling' ? element.inductors.map((name) => branchIndex.get(name)!) : [],
      ),
    ),
    isReactive,
  };
}

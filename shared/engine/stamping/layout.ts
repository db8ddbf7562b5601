import type { Topology } from '../circuit/topology.ts';
import { sparsePattern, type SparsePattern } from '../linear/sparse-pattern.ts';

/** Where the equations of a topology have their entries; found once for each. */
export interface Layout {
  readonly pattern: SparsePattern;
  /** the entries that never change, the currents of Kirchhoff's law; then the sink */
  readonly constant: Float64Array;
  readonly nodeSlot: Int32Array;
  readonly fromSlot: Int32Array;
  readonly toSlot: Int32Array;
  readonly ownSlot: Int32Array;
  /** slots (first row, second column) and (second row, first column) of each coupling */
  readonly mutualSlot: Int32Array;
}

const layouts = new WeakMap<Topology, Layout>();

export function layoutOf(topology: Topology): Layout {
  const known = layouts.get(topology);
  if (known !== undefined) return known;
  const layout = findLayout(topology);
  layouts.set(topology, layout);
  return layout;
}

function findLayout({ nodeCount, branchCount, size, from, to, coupledBranches }: Topology): Layout {
  const rows: number[] = [];
  const columns: number[] = [];
  const place = (row: number, column: number): number => {
    if (row === size || column === size) return -1;
    rows.push(row);
    columns.push(column);
    return rows.length - 1;
  };
  const branches = Array.from({ length: branchCount }, (_, k) => k);
  // both ends on one node: the branch sees no voltage and the node no current
  const isJoining = (k: number): boolean => from[k] !== to[k];
  const joining = (k: number, row: number, column: number): number =>
    isJoining(k) ? place(row, column) : -1;
  const node = Array.from({ length: nodeCount }, (_, at) => place(at, at));
  const leaving = branches.map((k) => joining(k, from[k]!, nodeCount + k));
  const entering = branches.map((k) => joining(k, to[k]!, nodeCount + k));
  const atFrom = branches.map((k) => joining(k, nodeCount + k, from[k]!));
  const atTo = branches.map((k) => joining(k, nodeCount + k, to[k]!));
  const own = branches.map((k) => place(nodeCount + k, nodeCount + k));
  const mutual = Array.from(coupledBranches, (branch, at) =>
    place(nodeCount + branch, nodeCount + coupledBranches[at ^ 1]!),
  );
  const { pattern, slots } = sparsePattern(size, rows, columns);
  const sink = pattern.rowIndex.length;
  const slotsOf = (places: readonly number[]): Int32Array =>
    Int32Array.from(places, (at) => (at < 0 ? sink : slots[at]!));
  const constant = new Float64Array(sink + 1);
  for (const slot of slotsOf(leaving)) if (slot !== sink) constant[slot] = 1;
  for (const slot of slotsOf(entering)) if (slot !== sink) constant[slot] = -1;
  return {
    pattern,
    constant,
    nodeSlot: slotsOf(node),
    fromSlot: slotsOf(atFrom),
    toSlot: slotsOf(atTo),
    ownSlot: slotsOf(own),
    mutualSlot: slotsOf(mutual),
  };
}

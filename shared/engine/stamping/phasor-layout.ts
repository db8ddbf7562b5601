import type { Topology } from '../circuit/topology.ts';
import { sparsePattern, type SparsePattern } from '../linear/sparse-pattern.ts';

/** Slots of one complex entry: real upper, real lower, minus imaginary upper, imaginary lower; -1 for none. */
export type PhasorEntry = readonly [number, number, number, number];

/** Where the phasor equations of a topology have their entries; found once for each. */
export interface PhasorLayout {
  readonly pattern: SparsePattern;
  readonly node: readonly PhasorEntry[];
  readonly leaving: readonly PhasorEntry[];
  readonly entering: readonly PhasorEntry[];
  readonly fromEntry: readonly PhasorEntry[];
  readonly toEntry: readonly PhasorEntry[];
  readonly ownEntry: readonly PhasorEntry[];
  /** rows (first, second) of each coupling, in turn */
  readonly mutualEntry: readonly PhasorEntry[];
}

const layouts = new WeakMap<Topology, PhasorLayout>();
const NONE: PhasorEntry = [-1, -1, -1, -1];

export function phasorLayoutOf(topology: Topology): PhasorLayout {
  const known = layouts.get(topology);
  if (known !== undefined) return known;
  const layout = findLayout(topology);
  layouts.set(topology, layout);
  return layout;
}

function findLayout(topology: Topology): PhasorLayout {
  const { nodeCount, branchCount, size, from, to, coupledBranches, isReactive } = topology;
  const rows: number[] = [];
  const columns: number[] = [];
  const put = (row: number, column: number): number => {
    rows.push(row);
    columns.push(column);
    return rows.length - 1;
  };
  const place = (row: number, column: number, isReal: boolean): PhasorEntry => {
    if (row === size || column === size) return NONE;
    const real = [put(row, column), put(row + size, column + size)] as const;
    return isReal ? [...real, -1, -1] : [...real, put(row, column + size), put(row + size, column)];
  };
  const branches = Array.from({ length: branchCount }, (_, k) => k);
  const joining = (k: number, row: number, column: number, isReal: boolean): PhasorEntry =>
    from[k] === to[k] ? NONE : place(row, column, isReal);
  const node = Array.from({ length: nodeCount }, (_, at) => place(at, at, true));
  const leaving = branches.map((k) => joining(k, from[k]!, nodeCount + k, true));
  const entering = branches.map((k) => joining(k, to[k]!, nodeCount + k, true));
  const fromEntry = branches.map((k) => joining(k, nodeCount + k, from[k]!, !isReactive[k]!));
  const toEntry = branches.map((k) => joining(k, nodeCount + k, to[k]!, !isReactive[k]!));
  const ownEntry = branches.map((k) => place(nodeCount + k, nodeCount + k, !isReactive[k]!));
  const mutualEntry = Array.from(coupledBranches, (branch, at) =>
    place(nodeCount + branch, nodeCount + coupledBranches[at ^ 1]!, false),
  );
  const { pattern, slots } = sparsePattern(2 * size, rows, columns);
  const slotOf = (at: number): number => (at < 0 ? -1 : slots[at]!);
  const settle = (entries: readonly PhasorEntry[]): PhasorEntry[] =>
    entries.map(([a, b, c, d]) => [slotOf(a), slotOf(b), slotOf(c), slotOf(d)]);
  return {
    pattern,
    node: settle(node),
    leaving: settle(leaving),
    entering: settle(entering),
    fromEntry: settle(fromEntry),
    toEntry: settle(toEntry),
    ownEntry: settle(ownEntry),
    mutualEntry: settle(mutualEntry),
  };
}

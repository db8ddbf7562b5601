import type { Netlist } from '../circuit/netlist.ts';
import { sparsePattern, type SparsePattern } from '../linear/sparse-pattern.ts';

/**
 * The equations of a circuit, one row a node and one row a branch.
 *
 *   node a:    sum of branch currents leaving a + G V_a = current sources into a
 *   branch k:  alpha (V_from - V_to) - beta I_k - sum_m mu_m I_m = rho
 *
 * Every branch keeps its own current as an unknown, so that Kirchhoff's current law is a sum of
 * unknowns and holds to rounding even where 3 milliohm stands beside 1e12 ohm at 3 kV, where a
 * current taken as (V_a - V_b) / R would be noise. Currents are counted in units of 1/REFERENCE A,
 * and each branch row is scaled so that its largest coefficient is 1.
 *
 * Sign: branch current is positive from `from`, through the element, to `to`.
 * Source: C. W. Ho, A. E. Ruehli, P. A. Brennan, IEEE Trans. CAS 22 (1975) 504-509 (modified nodal
 * analysis); keeping every branch current is its sparse-tableau end.
 */
export interface System {
  readonly netlist: Netlist;
  readonly pattern: SparsePattern;
  /** one per slot, then a sink that ground entries are written to */ readonly values: Float64Array;
  readonly nodeSlot: Int32Array;
  readonly fromSlot: Int32Array;
  readonly toSlot: Int32Array;
  readonly ownSlot: Int32Array;
  /** slots (first row, second column) and (second row, first column) of each coupling */
  readonly mutualSlot: Int32Array;
  readonly alpha: Float64Array;
  readonly beta: Float64Array;
  /** mu of each coupling in the row of its first and of its second inductor */
  readonly mu: Float64Array;
  readonly rho: Float64Array;
  /** current sources into each node, scaled */ readonly injected: Float64Array;
  /** conductance of every node to ground, S */ groundConductance: number;
  /** a coefficient changed since the matrix was last factored */ isStale: boolean;
  /** unknowns; index `size` is ground */ readonly x: Float64Array;
  readonly residual: Float64Array;
  readonly step: Float64Array;
}

/** Ohm. The middle, in decades, of 3 milliohm and 1e12 ohm: currents and voltages then weigh alike. */
export const REFERENCE = 1e5;

export function createSystem(netlist: Netlist, groundConductance: number): System {
  const { nodeCount, branches, coupled, from, to, size } = netlist;
  const rows: number[] = [];
  const columns: number[] = [];
  const place = (row: number, column: number): number => {
    if (row === size || column === size) return -1;
    rows.push(row);
    columns.push(column);
    return rows.length - 1;
  };
  const node = Array.from({ length: nodeCount }, (_, at) => place(at, at));
  const leaving = branches.map((_, k) => place(from[k]!, nodeCount + k));
  const entering = branches.map((_, k) => place(to[k]!, nodeCount + k));
  const atFrom = branches.map((_, k) => place(nodeCount + k, from[k]!));
  const atTo = branches.map((_, k) => place(nodeCount + k, to[k]!));
  const own = branches.map((_, k) => place(nodeCount + k, nodeCount + k));
  const mutual = coupled.flatMap(({ first, second }) => [
    place(nodeCount + first, nodeCount + second),
    place(nodeCount + second, nodeCount + first),
  ]);
  const { pattern, slots } = sparsePattern(size, rows, columns);
  const sink = pattern.rowIndex.length;
  const slotsOf = (places: readonly number[]): Int32Array =>
    Int32Array.from(places, (at) => (at < 0 ? sink : slots[at]!));
  const values = new Float64Array(sink + 1);
  const fromSlot = slotsOf(atFrom);
  const toSlot = slotsOf(atTo);
  branches.forEach((_, k) => {
    // both ends on one node: the branch sees no voltage and the node no current
    if (from[k] === to[k]) {
      fromSlot[k] = sink;
      toSlot[k] = sink;
      return;
    }
    if (leaving[k]! >= 0) values[slots[leaving[k]!]!] = 1;
    if (entering[k]! >= 0) values[slots[entering[k]!]!] = -1;
  });
  const system: System = {
    netlist,
    pattern,
    values,
    nodeSlot: slotsOf(node),
    fromSlot,
    toSlot,
    ownSlot: slotsOf(own),
    mutualSlot: slotsOf(mutual),
    ...vectors(netlist),
    groundConductance,
    isStale: true,
  };
  setGroundConductance(system, groundConductance);
  return system;
}

function vectors(netlist: Netlist) {
  const { size, branches, coupled } = netlist;
  return {
    alpha: new Float64Array(branches.length),
    beta: new Float64Array(branches.length),
    mu: new Float64Array(2 * coupled.length),
    rho: new Float64Array(branches.length),
    injected: new Float64Array(netlist.nodeCount),
    x: new Float64Array(size + 1),
    residual: new Float64Array(size + 1),
    step: new Float64Array(size + 1),
  };
}

/** Puts `conductance` (S) from every node to ground. */
export function setGroundConductance(system: System, conductance: number): void {
  system.groundConductance = conductance;
  system.isStale = true;
  const { values, nodeSlot } = system;
  for (let at = 0; at < nodeSlot.length; at += 1) values[nodeSlot[at]!] = conductance * REFERENCE;
}

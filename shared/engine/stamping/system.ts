import type { Netlist } from '../circuit/netlist.ts';
import { layoutOf, type Layout } from './layout.ts';

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
export interface System extends Layout {
  readonly netlist: Netlist;
  /** one per slot, then a sink that ground entries are written to */ readonly values: Float64Array;
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
  /** room for the largest current at each node */ readonly largest: Float64Array;
}

/** Ohm. The middle, in decades, of 3 milliohm and 1e12 ohm: currents and voltages then weigh alike. */
export const REFERENCE = 1e5;

export function createSystem(netlist: Netlist, groundConductance: number): System {
  const { size, branchCount, nodeCount, coupled } = netlist;
  const layout = layoutOf(netlist.topology);
  const system: System = {
    netlist,
    ...layout,
    values: layout.constant.slice(),
    alpha: new Float64Array(branchCount),
    beta: new Float64Array(branchCount),
    mu: new Float64Array(2 * coupled.length),
    rho: new Float64Array(branchCount),
    injected: new Float64Array(nodeCount),
    groundConductance,
    isStale: true,
    x: new Float64Array(size + 1),
    residual: new Float64Array(size + 1),
    step: new Float64Array(size + 1),
    largest: new Float64Array(size + 1),
  };
  setGroundConductance(system, groundConductance);
  return system;
}

/** Puts `conductance` (S) from every node to ground. */
export function setGroundConductance(system: System, conductance: number): void {
  system.groundConductance = conductance;
  system.isStale = true;
  const { values, nodeSlot } = system;
  for (let at = 0; at < nodeSlot.length; at += 1) values[nodeSlot[at]!] = conductance * REFERENCE;
}

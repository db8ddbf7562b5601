import { solveFactored } from '../linear/factors.ts';
import { REFERENCE } from '../stamping/system.ts';
import type { Machine } from './machine.ts';

/**
 * Columns of the inverse of a factored machine, each solved once when it is first asked for: every
 * unknown (V, and A times REFERENCE) for one source put into the circuit.
 */
export interface PortColumns {
  /** 1 A driven into node `a` and out of node `b` */ pair(a: number, b: number): Float64Array;
  /** 1 V in series with a branch, driving its current */ emf(branch: number): Float64Array;
}

export function createPortColumns({ netlist, system, factors }: Machine): PortColumns {
  const { size, nodeCount } = netlist;
  const pairs = new Map<number, Float64Array>();
  const emfs = new Map<number, Float64Array>();
  const nothing = new Float64Array(size + 1);
  return {
    pair: (a, b) => {
      if (a === b) return nothing;
      const key = a * (size + 1) + b;
      const known = pairs.get(key);
      if (known !== undefined) return known;
      const column = new Float64Array(size + 1);
      column[a] = REFERENCE;
      column[b] = -REFERENCE;
      column[size] = 0;
      solveFactored(factors, column, column);
      column[size] = 0;
      pairs.set(key, column);
      return column;
    },
    emf: (branch) => {
      const known = emfs.get(branch);
      if (known !== undefined) return known;
      const column = new Float64Array(size + 1);
      column[nodeCount + branch] = -system.alpha[branch]!;
      solveFactored(factors, column, column);
      emfs.set(branch, column);
      return column;
    },
  };
}

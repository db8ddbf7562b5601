/**
 * Coupled windings on one core.
 *   k_ij = l_i l_j + g_ij s sqrt((1 - l_i^2)(1 - l_j^2))
 * l: share of a winding's flux that is the core's common flux (1 for at most one winding);
 * g: 1 for windings wound on the same limb (they share a part s of their leakage), else 0.
 * Written this way the inductance matrix is positive definite for every set of windings.
 * Each winding's dot is at its first node.
 * Source: factor form of a correlation matrix; the shares are judgement.
 */
import type { Element, NodeName } from '../../engine/circuit/circuit.ts';
import { BROKEN, resistance } from './resistance.ts';

export interface Winding {
  name: string;
  nodes: readonly [NodeName, NodeName];
  /** H */ inductance: number;
  /** Ohm */ resistance: number;
  /** the wire is broken at its first end */ isOpen?: boolean;
  linkage: number;
  limb: string;
}

const SHARED_LEAKAGE = 0.375;

function coefficient(first: Winding, second: Winding): number {
  const leakage = Math.sqrt((1 - first.linkage ** 2) * (1 - second.linkage ** 2));
  const shared = first.limb === second.limb ? SHARED_LEAKAGE * leakage : 0;
  return first.linkage * second.linkage + shared;
}

function wound(winding: Winding): Element[] {
  const { name, inductance } = winding;
  const [from, to] = winding.nodes;
  const inductor = (start: NodeName): Element => ({
    kind: 'inductor',
    name,
    nodes: [start, to],
    inductance,
    seriesResistance: winding.resistance,
  });
  if (!winding.isOpen) return [inductor(from)];
  const broken = `${name}-break`;
  return [resistance(broken, from, broken, BROKEN), inductor(broken)];
}

/** Inductors and every pairwise coupling. */
export function windings(all: readonly Winding[]): Element[] {
  const couplings = all.flatMap((first, index) =>
    all.slice(index + 1).map((second): Element => ({
      kind: 'coupling',
      name: `${first.name}-with-${second.name}`,
      inductors: [first.name, second.name],
      coefficient: coefficient(first, second),
    })),
  );
  return [...all.flatMap(wound), ...couplings];
}

/**
 * Coupled windings on one core.
 *   k_ij = l_i l_j + g_ij s sqrt((1 - l_i^2)(1 - l_j^2))
 * l: share of a winding's flux that is the core's common flux (1 for at most one winding);
 * g: 1 for windings wound on the same limb (they share a part s of their leakage), else 0.
 * Written this way the inductance matrix is positive definite for every set of windings.
 * Each winding's dot is at its first node.
 * Iron loses q = 6 times less than it stores per radian at 60 Hz: R = q n w L across each of the n
 * windings of a core (40 W in the high-voltage transformer at no load). It carries nothing at rest,
 * and ends the ringing that a winding without loss would go on with for seconds.
 * Source: factor form of a correlation matrix; the shares and q are judgement.
 */
import { square } from '../../engine/elementary/power.ts';
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
  const leakage = Math.sqrt((1 - square(first.linkage)) * (1 - square(second.linkage)));
  const shared = first.limb === second.limb ? SHARED_LEAKAGE * leakage : 0;
  return first.linkage * second.linkage + shared;
}

const IRON_QUALITY = 6;
const MAINS = 2 * Math.PI * 60;

/** Break, wire, then the inductance with the iron's loss across it. */
function wound(winding: Winding, onCore: number): Element[] {
  const { name, inductance, nodes } = winding;
  const [from, to] = nodes;
  const broken = `${name}-break`;
  const inside = `${name}-inside`;
  const start = winding.isOpen ? broken : from;
  const iron = IRON_QUALITY * onCore * MAINS * inductance;
  const wire = winding.resistance;
  const wired = wire > 0 ? inside : start;
  return [
    ...(winding.isOpen ? [resistance(broken, from, broken, BROKEN)] : []),
    ...(wire > 0 ? [resistance(`${name}-wire-inside`, start, inside, wire)] : []),
    resistance(`${name}-iron`, wired, to, iron),
    { kind: 'inductor', name, nodes: [wired, to], inductance },
  ];
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
  return [...all.flatMap((winding) => wound(winding, all.length)), ...couplings];
}

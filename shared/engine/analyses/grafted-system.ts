import { solveDense } from '../linear/dense-lu.ts';
import { REFERENCE } from '../stamping/system.ts';
import type { Graft } from './graft.ts';

/**
 * A changed circuit as the old one with sources in it. Unknowns w: for each raised branch the voltage
 * e its new resistance takes, for each added branch the current q it sends back (-j), for each new
 * node its voltage u.
 *   raised:  I_k + e / R = 0 (R infinite for a cut)
 *   added:   V_a - V_b + u_a - u_b + R q = 0, or -excess / g of its junction
 *   new:     sum of q = 0
 * with I and V of the old circuit under the input and all of w. This is the bordered form of the
 * Sherman-Morrison-Woodbury identity (W. W. Hager, SIAM Review 31 (1989) 221-239, from memory):
 * written in e and q it takes no difference of nearly equal numbers for any change of resistance.
 */
export interface GraftedSystem {
  size: number;
  matrix: Float64Array;
  working: Float64Array;
}

/** One over what each added branch's row is divided by: its resistance where that is large. */
const shareOf = (ohms: number): number => 1 / Math.max(1, ohms / REFERENCE);

/** Rooms by size, so that a change finds one ready. */
export function systemOf(rooms: (GraftedSystem | undefined)[], graft: Graft): GraftedSystem {
  const size = graft.raisedCount + graft.branchCount + graft.freshCount;
  const known = rooms[size];
  if (known !== undefined) {
    known.matrix.fill(0);
    return known;
  }
  const length = size * size;
  const made = { size, matrix: new Float64Array(length), working: new Float64Array(length) };
  rooms[size] = made;
  return made;
}

export function writeSystem(
  { size, matrix }: GraftedSystem,
  graft: Graft,
  nodeCount: number,
): void {
  const { raisedCount, branchCount, raised, gained, columns } = graft;
  const { from, to, freshFrom, freshTo, ohms } = graft;
  const nodesAt = raisedCount + branchCount;
  for (let r = 0; r < raisedCount; r += 1) {
    const at = nodeCount + raised[r]!;
    for (let c = 0; c < nodesAt; c += 1) matrix[r * size + c] = columns[c]![at]!;
    matrix[r * size + r]! += REFERENCE / gained[r]!;
  }
  for (let branch = 0; branch < branchCount; branch += 1) {
    const r = raisedCount + branch;
    const by = shareOf(ohms[branch]!);
    const a = from[branch]!;
    const b = to[branch]!;
    for (let c = 0; c < nodesAt; c += 1)
      matrix[r * size + c] = by * (columns[c]![a]! - columns[c]![b]!);
    matrix[r * size + r]! += by * ohms[branch]!;
    const p = freshFrom[branch]!;
    const q = freshTo[branch]!;
    if (p >= 0) {
      matrix[r * size + nodesAt + p]! += by;
      matrix[(nodesAt + p) * size + r]! += 1;
    }
    if (q >= 0) {
      matrix[r * size + nodesAt + q]! -= by;
      matrix[(nodesAt + q) * size + r]! -= 1;
    }
  }
}

/**
 * w for an input of the old circuit (its every unknown; null: none) and for `excessAt`, the added
 * branch whose junction carries 1 A more than its straight line (-1: none). False without an answer.
 */
export function solveGrafted(
  system: GraftedSystem,
  graft: Graft,
  nodeCount: number,
  input: Float64Array | null,
  excessAt: number,
  w: Float64Array,
): boolean {
  const { raisedCount, branchCount, raised, from, to, ohms } = graft;
  w.fill(0);
  let isDriven = excessAt >= 0;
  if (input !== null) {
    for (let r = 0; r < raisedCount; r += 1) {
      w[r] = -input[nodeCount + raised[r]!]!;
      isDriven ||= w[r] !== 0;
    }
    for (let at = 0; at < branchCount; at += 1) {
      w[raisedCount + at] = -shareOf(ohms[at]!) * (input[from[at]!]! - input[to[at]!]!);
      isDriven ||= w[raisedCount + at] !== 0;
    }
  }
  if (!isDriven) return true;
  if (excessAt >= 0)
    w[raisedCount + excessAt]! -= shareOf(ohms[excessAt]!) / graft.junctions[excessAt]!.conductance;
  if (system.size === 1) {
    w[0]! /= system.matrix[0]!;
    return Number.isFinite(w[0]!);
  }
  system.working.set(system.matrix);
  return solveDense(system.working, w);
}

/** The unknown at `a` less the one at `b` (a node's V, a branch's A times REFERENCE), input and w together. */
export function differenceIn(
  graft: Graft,
  input: Float64Array | null,
  w: Float64Array,
  a: number,
  b: number,
): number {
  const { columns, columnCount } = graft;
  let value = input === null ? 0 : input[a]! - input[b]!;
  for (let c = 0; c < columnCount; c += 1) value += w[c]! * (columns[c]![a]! - columns[c]![b]!);
  return value;
}

/** V across the junction of the added branch `at`, its RS taken off. */
export function addedJunctionVolts(
  graft: Graft,
  input: Float64Array | null,
  w: Float64Array,
  at: number,
): number {
  const nodesAt = graft.raisedCount + graft.branchCount;
  const p = graft.freshFrom[at]!;
  const q = graft.freshTo[at]!;
  const across =
    differenceIn(graft, input, w, graft.from[at]!, graft.to[at]!) +
    (p < 0 ? 0 : w[nodesAt + p]!) -
    (q < 0 ? 0 : w[nodesAt + q]!);
  return across + graft.junctions[at]!.seriesResistance * w[graft.raisedCount + at]!;
}

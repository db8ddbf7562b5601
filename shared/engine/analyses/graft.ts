import type { CircuitChange } from '../circuit/circuit-change.ts';
import type { NodeName } from '../circuit/circuit.ts';
import { createJunction } from '../devices/diode.ts';
import type { Junction } from '../devices/diode-law.ts';
import { thermalVoltage } from '../quantities/physical-constants.ts';
import type { EngineOptions, Machine } from './machine.ts';
import type { PortColumns } from './port-columns.ts';

/** A change of a circuit by the indices of the machine that carries it. One room, filled anew for each change. */
export interface Graft {
  raisedCount: number;
  branchCount: number;
  freshCount: number;
  /** branches that gain a resistance in series */ readonly raised: Int32Array;
  /** Ohm, Infinity for a cut */ readonly gained: Float64Array;
  /** old nodes where each added branch's current leaves and enters the old circuit */
  readonly from: Int32Array;
  readonly to: Int32Array;
  /** new node at each of its ends, -1 where that end is an old one */
  readonly freshFrom: Int32Array;
  readonly freshTo: Int32Array;
  /** Ohm of each added branch; of a junction its RS and the slope of its straight line */
  readonly ohms: Float64Array;
  /** of each added branch, null for a resistance */ readonly junctions: (Junction | null)[];
  /** the old circuit's answer to each raised branch's volt, then to each added branch's ampere */
  readonly columns: Float64Array[];
  columnCount: number;
  /** names of new nodes, and the old node each counts its voltage from */
  readonly freshNames: NodeName[];
  readonly references: Int32Array;
}

/** Raised or added branches and new nodes of one change; more is not a fault but another circuit. */
const MOST = 32;

export function createGraft(): Graft {
  return {
    raisedCount: 0,
    branchCount: 0,
    freshCount: 0,
    raised: new Int32Array(MOST),
    gained: new Float64Array(MOST),
    from: new Int32Array(MOST),
    to: new Int32Array(MOST),
    freshFrom: new Int32Array(MOST),
    freshTo: new Int32Array(MOST),
    ohms: new Float64Array(MOST),
    junctions: [],
    columns: [],
    columnCount: 0,
    freshNames: [],
    references: new Int32Array(2 * MOST),
  };
}

/**
 * Finds the change's places in the machine; false where it names a branch that is not there, is too
 * large, or has new nodes that nothing joins to the old circuit. A group of new nodes counts its
 * voltages from one old node it is joined to, and all its current leaves the old circuit there: so
 * two islands that share no more than 1e-12 S never meet in a difference of large numbers.
 */
export function fillGraft(
  graft: Graft,
  machine: Machine,
  columns: PortColumns,
  change: CircuitChange,
  options: EngineOptions,
): boolean {
  const { cut, raised, joined, junctions } = change;
  if (cut.length + raised.length > MOST || joined.length + junctions.length > MOST) return false;
  const { branchIndex } = machine.netlist;
  graft.raisedCount = 0;
  graft.columnCount = 0;
  for (const name of cut) if (!raise(graft, columns, branchIndex.get(name), Infinity)) return false;
  for (const { name, ohms } of raised)
    if (!raise(graft, columns, branchIndex.get(name), ohms)) return false;
  graft.branchCount = joined.length + junctions.length;
  if (graft.freshNames.length > 0) graft.freshNames.length = 0;
  let at = 0;
  for (const { nodes, ohms } of joined) {
    place(graft, machine, at, nodes);
    graft.ohms[at] = ohms;
    graft.junctions[at] = null;
    at += 1;
  }
  for (const { nodes, model } of junctions) {
    const law = options.junctionLaw ?? 'shockley';
    const junction = createJunction(-1, model, options.thermalVoltage ?? thermalVoltage(), law);
    place(graft, machine, at, nodes);
    graft.ohms[at] = junction.seriesResistance + 1 / junction.conductance;
    graft.junctions[at] = junction;
    at += 1;
  }
  if (graft.freshNames.length > 0) dropStubs(graft);
  graft.freshCount = graft.freshNames.length;
  if (graft.freshCount > 0 && !findReferences(graft)) return false;
  for (let branch = 0; branch < graft.branchCount; branch += 1)
    addColumn(graft, columns.pair(graft.from[branch]!, graft.to[branch]!));
  return true;
}

function raise(
  graft: Graft,
  columns: PortColumns,
  branch: number | undefined,
  ohms: number,
): boolean {
  if (branch === undefined) return false;
  graft.raised[graft.raisedCount] = branch;
  graft.gained[graft.raisedCount] = ohms;
  graft.raisedCount += 1;
  addColumn(graft, columns.emf(branch));
  return true;
}

function addColumn(graft: Graft, column: Float64Array): void {
  graft.columns[graft.columnCount] = column;
  graft.columnCount += 1;
}

function place(
  graft: Graft,
  { netlist }: Machine,
  at: number,
  nodes: readonly [NodeName, NodeName],
): void {
  const from = netlist.nodeIndex.get(nodes[0]);
  const to = netlist.nodeIndex.get(nodes[1]);
  graft.from[at] = from ?? -1;
  graft.to[at] = to ?? -1;
  graft.freshFrom[at] = from === undefined ? fresh(graft, nodes[0]) : -1;
  graft.freshTo[at] = to === undefined ? fresh(graft, nodes[1]) : -1;
}

function fresh(graft: Graft, node: NodeName): number {
  const met = graft.freshNames.indexOf(node);
  return met >= 0 ? met : graft.freshNames.push(node) - 1;
}

/** Leaves out added branches that end at a new node of their own: nothing can flow there. */
function dropStubs(graft: Graft): void {
  const { freshFrom, freshTo, freshNames, branchCount } = graft;
  for (let node = freshNames.length - 1; node >= 0; node -= 1) {
    let meeting = 0;
    let last = -1;
    for (let at = 0; at < branchCount; at += 1) {
      if (freshFrom[at] !== node && freshTo[at] !== node) continue;
      meeting += 1;
      last = at;
    }
    if (meeting > 1 || (last >= 0 && graft.junctions[last] !== null)) continue;
    if (node === freshNames.length - 1) freshNames.pop();
    else renumber(graft, node);
    if (last >= 0) dropBranch(graft, last);
    dropStubs(graft);
    return;
  }
}

/** Gives the last new node the number of one that is gone. */
function renumber({ freshFrom, freshTo, freshNames, branchCount }: Graft, gone: number): void {
  const last = freshNames.length - 1;
  freshNames[gone] = freshNames[last]!;
  freshNames.pop();
  for (let at = 0; at < branchCount; at += 1) {
    if (freshFrom[at] === last) freshFrom[at] = gone;
    if (freshTo[at] === last) freshTo[at] = gone;
  }
}

/** Puts the last added branch in the place of one that is gone. */
function dropBranch(graft: Graft, gone: number): void {
  const { from, to, freshFrom, freshTo, ohms, junctions } = graft;
  const last = graft.branchCount - 1;
  for (const list of [from, to, freshFrom, freshTo, ohms]) list[gone] = list[last]!;
  junctions[gone] = junctions[last]!;
  graft.branchCount = last;
}

/** Gives every group of new nodes its old node, and each branch's new ends that old node's place. */
function findReferences(graft: Graft): boolean {
  const { from, to, freshFrom, freshTo, references, branchCount, freshCount } = graft;
  references.fill(-1);
  for (let round = 0; round < freshCount; round += 1) {
    for (let at = 0; at < branchCount; at += 1) {
      const a = freshFrom[at]! < 0 ? from[at]! : references[freshFrom[at]!]!;
      const b = freshTo[at]! < 0 ? to[at]! : references[freshTo[at]!]!;
      if (freshFrom[at]! >= 0 && a < 0) references[freshFrom[at]!] = b;
      if (freshTo[at]! >= 0 && b < 0) references[freshTo[at]!] = a;
    }
  }
  for (let at = 0; at < branchCount; at += 1) {
    if (freshFrom[at]! >= 0) from[at] = references[freshFrom[at]!]!;
    if (freshTo[at]! >= 0) to[at] = references[freshTo[at]!]!;
    if (from[at]! < 0 || to[at]! < 0) return false;
  }
  return true;
}

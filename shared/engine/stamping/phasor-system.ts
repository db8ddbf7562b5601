import type { Netlist } from '../circuit/netlist.ts';
import { sparsePattern, type SparsePattern } from '../linear/sparse-pattern.ts';
import { REFERENCE } from './system.ts';

/**
 * The equations of a circuit at one frequency, in complex amplitudes, one row a node and one row a
 * branch as in `System`, written as a real system of twice the size,
 *   [Re A  -Im A] [Re x]   [Re b]
 *   [Im A   Re A] [Im x] = [Im b],
 * so that one sparse elimination serves both. Entries that are always real have no imaginary slots.
 */
export interface PhasorSystem {
  readonly netlist: Netlist;
  readonly pattern: SparsePattern;
  readonly values: Float64Array;
  readonly fromEntry: Entry[];
  readonly toEntry: Entry[];
  readonly ownEntry: Entry[];
  /** rows (first, second) of each coupling, in turn */ readonly mutualEntry: Entry[];
  /** right-hand side, real parts then imaginary */ readonly b: Float64Array;
  readonly x: Float64Array;
}

/** Slots of one complex entry: real upper, real lower, minus imaginary upper, imaginary lower; -1 for none. */
type Entry = readonly [number, number, number, number];

export function createPhasorSystem(netlist: Netlist, groundConductance: number): PhasorSystem {
  const { nodeCount, branches, coupled, from, to, size } = netlist;
  const rows: number[] = [];
  const columns: number[] = [];
  const put = (row: number, column: number): number => {
    rows.push(row);
    columns.push(column);
    return rows.length - 1;
  };
  const NONE = [-1, -1, -1, -1] as const;
  const place = (row: number, column: number, isReal: boolean): Entry => {
    if (row === size || column === size) return NONE;
    const real = [put(row, column), put(row + size, column + size)] as const;
    return isReal ? [...real, -1, -1] : [...real, put(row, column + size), put(row + size, column)];
  };
  const isReal = branches.map(({ kind }) => kind !== 'capacitor' && kind !== 'inductor');
  const isOnOneNode = (k: number): boolean => from[k] === to[k];
  const node = Array.from({ length: nodeCount }, (_, at) => place(at, at, true));
  const leaving = branches.map((_, k) =>
    isOnOneNode(k) ? NONE : place(from[k]!, nodeCount + k, true),
  );
  const entering = branches.map((_, k) =>
    isOnOneNode(k) ? NONE : place(to[k]!, nodeCount + k, true),
  );
  const atEnd = (ends: Int32Array) => (_: unknown, k: number) =>
    isOnOneNode(k) ? NONE : place(nodeCount + k, ends[k]!, isReal[k]!);
  const fromEntry = branches.map(atEnd(from));
  const toEntry = branches.map(atEnd(to));
  const ownEntry = branches.map((_, k) => place(nodeCount + k, nodeCount + k, isReal[k]!));
  const mutualEntry = coupled.flatMap(({ first, second }) => [
    place(nodeCount + first, nodeCount + second, false),
    place(nodeCount + second, nodeCount + first, false),
  ]);
  const { pattern, slots } = sparsePattern(2 * size, rows, columns);
  const settle = (entry: Entry): Entry =>
    entry.map((at) => (at < 0 ? -1 : slots[at]!)) as unknown as Entry;
  const system: PhasorSystem = {
    netlist,
    pattern,
    values: new Float64Array(pattern.rowIndex.length),
    fromEntry: fromEntry.map(settle),
    toEntry: toEntry.map(settle),
    ownEntry: ownEntry.map(settle),
    mutualEntry: mutualEntry.map(settle),
    b: new Float64Array(2 * size),
    x: new Float64Array(2 * size),
  };
  node.forEach((entry) => setEntry(system, settle(entry), groundConductance * REFERENCE, 0));
  leaving.forEach((entry) => setEntry(system, settle(entry), 1, 0));
  entering.forEach((entry) => setEntry(system, settle(entry), -1, 0));
  return system;
}

function setEntry({ values }: PhasorSystem, entry: Entry, real: number, imaginary: number): void {
  const [upper, lower, minus, plus] = entry;
  if (upper >= 0) values[upper] = real;
  if (lower >= 0) values[lower] = real;
  if (minus >= 0) values[minus] = -imaginary;
  if (plus >= 0) values[plus] = imaginary;
}

/**
 * Writes branch k as V = (resistance + j reactance) I, Ohm, scaled to a largest coefficient of 1.
 * Returns the scale, which the branch's own right-hand side and couplings take as well.
 */
export function setImpedance(
  system: PhasorSystem,
  k: number,
  resistance: number,
  reactance: number,
): number {
  const size = Math.hypot(resistance, reactance) / REFERENCE;
  const scale = size > 1 ? 1 / size : 1;
  setEntry(system, system.fromEntry[k]!, scale, 0);
  setEntry(system, system.toEntry[k]!, -scale, 0);
  const real = (scale * resistance) / REFERENCE;
  setEntry(system, system.ownEntry[k]!, -real, (-scale * reactance) / REFERENCE);
  return scale;
}

/** Writes branch k as I = (conductance + j susceptance) V, S; both 0 is an open. */
export function setAdmittance(
  system: PhasorSystem,
  k: number,
  conductance: number,
  susceptance: number,
): void {
  const scaled = REFERENCE * Math.hypot(conductance, susceptance);
  const scale = scaled > 1 ? 1 / scaled : 1;
  const real = scale * REFERENCE * conductance;
  const imaginary = scale * REFERENCE * susceptance;
  setEntry(system, system.fromEntry[k]!, real, imaginary);
  setEntry(system, system.toEntry[k]!, -real, -imaginary);
  setEntry(system, system.ownEntry[k]!, -scale, 0);
}

/** Writes j reactance (Ohm) between the windings of coupling c, in the row of its side, at that row's scale. */
export function setMutualReactance(
  system: PhasorSystem,
  c: number,
  side: 0 | 1,
  reactance: number,
  scale: number,
): void {
  setEntry(system, system.mutualEntry[2 * c + side]!, 0, (-scale * reactance) / REFERENCE);
}

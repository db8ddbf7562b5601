import type { Netlist } from '../circuit/netlist.ts';
import { phasorLayoutOf, type PhasorEntry, type PhasorLayout } from './phasor-layout.ts';
import { REFERENCE } from './system.ts';
import { magnitude } from '../elementary/magnitude.ts';

/**
 * The equations of a circuit at one frequency, in complex amplitudes, one row a node and one row a
 * branch as in `System`, written as a real system of twice the size,
 *   [Re A  -Im A] [Re x]   [Re b]
 *   [Im A   Re A] [Im x] = [Im b],
 * so that one sparse elimination serves both. Entries that are always real have no imaginary slots.
 */
export interface PhasorSystem extends PhasorLayout {
  readonly netlist: Netlist;
  readonly values: Float64Array;
  /** right-hand side, real parts then imaginary */ readonly b: Float64Array;
  readonly x: Float64Array;
}

export function createPhasorSystem(netlist: Netlist, groundConductance: number): PhasorSystem {
  const layout = phasorLayoutOf(netlist.topology);
  const system: PhasorSystem = {
    netlist,
    ...layout,
    values: new Float64Array(layout.pattern.rowIndex.length),
    b: new Float64Array(2 * netlist.size),
    x: new Float64Array(2 * netlist.size),
  };
  for (const entry of layout.node) setEntry(system, entry, groundConductance * REFERENCE, 0);
  for (const entry of layout.leaving) setEntry(system, entry, 1, 0);
  for (const entry of layout.entering) setEntry(system, entry, -1, 0);
  return system;
}

function setEntry(
  { values }: PhasorSystem,
  entry: PhasorEntry,
  real: number,
  imaginary: number,
): void {
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
  const size = magnitude(resistance, reactance) / REFERENCE;
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
  const scaled = REFERENCE * magnitude(conductance, susceptance);
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

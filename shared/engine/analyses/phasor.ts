import type { Circuit, EngineFailure, NodeName, Result } from '../circuit/circuit.ts';
import { createFactors, factor, solveFactored, type Factors } from '../linear/factors.ts';
import { cachedSymbolicLu } from '../linear/symbolic-cache.ts';
import { createPhasorSystem, type PhasorSystem } from '../stamping/phasor-system.ts';
import { REFERENCE } from '../stamping/system.ts';
import { createMachine, singular, type EngineOptions } from './machine.ts';
import { solveAtRest } from './operating-point.ts';
import { setPhasorSources, stampPhasor } from './stamp-phasor.ts';

/** [real, imaginary] */
export type Complex = readonly [number, number];

export interface Phasors {
  /** Hz */ frequency: number[];
  /** V by node, one for each frequency, in the measure (peak or rms) the sources' ac was given in */
  voltages: Record<NodeName, Complex[]>;
  /** A by name, of every element but couplings and current sources */
  currents: Record<string, Complex[]>;
}

/**
 * The circuit at each frequency (Hz), driven by the sources' `ac` alone, junctions and switches as
 * the operating point leaves them. Fails as the operating point does.
 */
export function phasor(
  circuit: Circuit,
  frequencies: readonly number[],
  options: EngineOptions = {},
): Result<Phasors> {
  const made = createMachine(circuit, 'steady', options);
  if (!made.ok) return made;
  const machine = made.value;
  const failure = badFrequency(frequencies) ?? solveAtRest(machine, 'rest');
  if (failure !== undefined) return { ok: false, failure };
  const { netlist } = machine;
  const phasors: Phasors = { frequency: [], voltages: { '0': [] }, currents: {} };
  for (const name of netlist.nodeNames) phasors.voltages[name] = [];
  for (const { name } of netlist.branches) phasors.currents[name] = [];
  const system = createPhasorSystem(netlist, machine.baseConductance);
  setPhasorSources(system, machine);
  let factors: Factors | undefined;
  for (const frequency of frequencies) {
    stampPhasor(system, machine, 2 * Math.PI * frequency);
    factors ??= begin(system);
    const column = factors === undefined ? 0 : solve(system, factors);
    if (column >= 0) return { ok: false, failure: singular(netlist, column % netlist.size) };
    read(phasors, system, frequency);
  }
  return { ok: true, value: phasors };
}

function badFrequency(frequencies: readonly number[]): EngineFailure | undefined {
  const bad = frequencies.find((frequency) => !(frequency >= 0 && Number.isFinite(frequency)));
  if (bad === undefined) return undefined;
  return { code: 'bad-element', element: 'frequency', message: `no frequency of ${bad} Hz` };
}

function begin({ pattern, values }: PhasorSystem): Factors | undefined {
  const found = cachedSymbolicLu(pattern, values);
  return 'symbolic' in found ? createFactors(pattern, found.symbolic) : undefined;
}

/** Solves and refines once; -1, or the column at which the matrix is singular. */
function solve(system: PhasorSystem, factors: Factors): number {
  const { pattern, values, b, x } = system;
  const column = factor(factors, values);
  if (column >= 0) return column;
  solveFactored(factors, b, x);
  const rest = b.slice();
  for (let at = 0; at < pattern.size; at += 1) {
    for (let slot = pattern.columnStart[at]!; slot < pattern.columnStart[at + 1]!; slot += 1) {
      rest[pattern.rowIndex[slot]!]! -= values[slot]! * x[at]!;
    }
  }
  solveFactored(factors, rest, rest);
  for (let at = 0; at < pattern.size; at += 1) x[at]! += rest[at]!;
  return x.every(Number.isFinite) ? -1 : 0;
}

function read(phasors: Phasors, { netlist, x }: PhasorSystem, frequency: number): void {
  const { size, nodeCount } = netlist;
  phasors.frequency.push(frequency);
  phasors.voltages['0']!.push([0, 0]);
  netlist.nodeNames.forEach((name, node) => {
    phasors.voltages[name]!.push([x[node]!, x[size + node]!]);
  });
  netlist.branches.forEach(({ name }, k) => {
    const at = nodeCount + k;
    phasors.currents[name]!.push([x[at]! / REFERENCE, x[size + at]! / REFERENCE]);
  });
}

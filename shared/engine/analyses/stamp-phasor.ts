import {
  setAdmittance,
  setImpedance,
  setMutualReactance,
  type PhasorSystem,
} from '../stamping/phasor-system.ts';
import { REFERENCE } from '../stamping/system.ts';
import type { Machine } from './machine.ts';
import { cos, sin } from '../elementary/sine.ts';

/** Writes every branch at angular frequency omega (rad/s), junctions linear as they stand. */
export function stampPhasor(system: PhasorSystem, machine: Machine, omega: number): void {
  const { netlist, resistors, capacitors, inductors, junctions, switches, sources } = machine;
  for (const { branch, value } of resistors) setImpedance(system, branch, value, 0);
  for (const { branch, isOn, model } of switches) {
    setImpedance(system, branch, isOn ? model.onResistance : model.offResistance, 0);
  }
  for (const { branch } of sources) if (branch >= 0) setImpedance(system, branch, 0, 0);
  for (const { branch, value } of capacitors) setAdmittance(system, branch, 0, omega * value);
  for (const { branch, conductance, seriesResistance } of junctions) {
    setAdmittance(system, branch, conductance / (1 + conductance * seriesResistance), 0);
  }
  const scales = inductors.map(({ branch, value, resistance }) =>
    setImpedance(system, branch, resistance, omega * value),
  );
  netlist.coupled.forEach((_, c) => {
    const reactance = omega * machine.mutuals[c]!;
    setMutualReactance(system, c, 0, reactance, scales[machine.windings[2 * c]!]!);
    setMutualReactance(system, c, 1, reactance, scales[machine.windings[2 * c + 1]!]!);
  });
}

/** Sets the right-hand side from the sources' ac magnitude and phase; the same at every frequency. */
export function setPhasorSources(system: PhasorSystem, machine: Machine): void {
  const { nodeCount, nodeIndex, size } = machine.netlist;
  const { b } = system;
  b.fill(0);
  const add = (row: number, real: number, imaginary: number): void => {
    if (row === size) return;
    b[row]! += real;
    b[size + row]! += imaginary;
  };
  for (const { element, branch } of machine.sources) {
    if (element.ac === undefined) continue;
    const phase = (element.ac.phaseDegrees * Math.PI) / 180;
    const real = element.ac.magnitude * cos(phase);
    const imaginary = element.ac.magnitude * sin(phase);
    if (branch >= 0) add(nodeCount + branch, real, imaginary);
    else {
      const [from, to] = element.nodes;
      add(nodeIndex.get(from)!, -REFERENCE * real, -REFERENCE * imaginary);
      add(nodeIndex.get(to)!, REFERENCE * real, REFERENCE * imaginary);
    }
  }
}

import type { Circuit, EngineFailure, OperatingPoint, Result } from '../circuit/circuit.ts';
import { mutualInductance } from '../devices/coupling.ts';
import { stampResistor } from '../devices/resistor.ts';
import { REFERENCE } from '../stamping/system.ts';
import { kclResidual } from './kcl-residual.ts';
import { createMachine, type EngineOptions, type Machine } from './machine.ts';
import { forget, solveWithSwitches } from './operating-point.ts';
import { readPoint } from './read-point.ts';
import { stampAtRest } from './stamp-at-rest.ts';

/** A circuit compiled once, solved many times with other values; the topology stays. */
export interface CompiledCircuit {
  readonly circuit: Circuit;
  /** for the engine's own analyses */ readonly machine: Machine;
  /**
   * Changes an element's value: Ohm, F, H, or the direct V or A of a source (which then ignores its
   * wave). A failure (bad-element) leaves it as it was.
   */
  setValue(name: string, value: number): EngineFailure | undefined;
  /** Solves the operating point from the last one; undefined when solved. */
  solve(): EngineFailure | undefined;
  /** Forgets the last solution: the next starts from nothing. */
  reset(): void;
  /** V of a node of the last solution; 0 for ground, NaN for a node that is not there */
  voltage(node: string): number;
  /** A through an element of the last solution; NaN for one that is not there or not a branch */
  current(name: string): number;
  /** the whole of the last solution by name */ point(): OperatingPoint;
  /** worst share by which Kirchhoff's current law fails at a node in the last solution */
  kclResidual(): number;
}

/** Compiles a circuit. Fails with bad-element, voltage-loop or floating-node. */
export function compile(circuit: Circuit, options: EngineOptions = {}): Result<CompiledCircuit> {
  const made = createMachine(circuit, 'steady', options);
  return made.ok ? { ok: true, value: compiled(made.value) } : made;
}

function compiled(machine: Machine): CompiledCircuit {
  const { circuit, netlist, system } = machine;
  stampAtRest(system, machine);
  return {
    circuit,
    machine,
    setValue: (name, value) => setValue(machine, name, value),
    solve: () => solveWithSwitches(machine, 'rest'),
    reset: () => forget(machine),
    voltage: (node) => {
      const at = netlist.nodeIndex.get(node);
      return at === undefined ? NaN : system.x[at]!;
    },
    current: (name) => {
      const branch = netlist.branchIndex.get(name);
      return branch === undefined ? NaN : system.x[netlist.nodeCount + branch]! / REFERENCE;
    },
    point: () => readPoint(machine),
    kclResidual: () => kclResidual(machine),
  };
}

function setValue(machine: Machine, name: string, value: number): EngineFailure | undefined {
  const bad = (fault: string): EngineFailure => ({
    code: 'bad-element',
    element: name,
    message: `${name}: ${fault}`,
  });
  if (!Number.isFinite(value)) return bad('the value is not finite');
  const source = machine.sources.find(({ element }) => element.name === name);
  if (source !== undefined) {
    source.fixed = value;
    return undefined;
  }
  const branch = machine.netlist.branchIndex.get(name);
  const { resistors, capacitors, inductors } = machine;
  const holds = (part: { branch: number }): boolean => part.branch === branch;
  const part = resistors.find(holds) ?? capacitors.find(holds) ?? inductors.find(holds);
  if (part === undefined)
    return bad('there is no resistor, capacitor, inductor or source of this name');
  if (value <= 0) return bad('the value is not above zero');
  part.value = value;
  if (resistors.some(holds)) stampResistor(machine.system, part.branch, value);
  else retuneWindings(machine);
  return undefined;
}

function retuneWindings({ netlist, inductors, windings, mutuals }: Machine): void {
  netlist.coupled.forEach(({ coefficient }, c) => {
    const [first, second] = [inductors[windings[2 * c]!]!, inductors[windings[2 * c + 1]!]!];
    mutuals[c] = mutualInductance(coefficient, first.value, second.value);
  });
}

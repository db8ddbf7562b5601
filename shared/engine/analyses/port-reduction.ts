import type { Circuit, Element, NodeName, Result } from '../circuit/circuit.ts';
import { stampDiode } from '../devices/diode.ts';
import { factor, solveFactored } from '../linear/factors.ts';
import { REFERENCE } from '../stamping/system.ts';
import type { CompiledCircuit } from './compile.ts';
import { junctionPorts, type JunctionPorts } from './junction-ports.ts';
import { createMachine, singular, type EngineOptions, type Machine } from './machine.ts';
import { operatingPoint, solveAtRest } from './operating-point.ts';
import { presentCircuit } from './present-circuit.ts';
import { createPortNewton, type PortNewton } from './port-newton.ts';

/** What a meter puts between its tips: an open voltage (V, red tip positive) behind a resistance (Ohm). */
export interface MeterPort {
  readonly openVolts: number;
  readonly sourceResistance: number;
}

export interface PortReading {
  /** V(red) - V(black) with the meter connected */ volts: number;
  /** A out of the red tip, through the circuit, into the black */ amps: number;
}

export interface PortSolver {
  /** What a meter at this pair of nodes sees; fails as the operating point of circuit and meter would. */
  probe(red: NodeName, black: NodeName, meter: MeterPort): Result<PortReading>;
}

/**
 * Solves a circuit once so that each next probe pair costs one triangular solve and a small system
 * over the junctions:
 *
 *   v_k = v_k0 + Y_k i + sum_j Z_kj d_j,   v_p = v_p0 + Z_pp i + sum_j P_j d_j,   i = (E - v_p) / R
 *
 * v_k are the junctions' voltages, i the meter's current, d_j what each junction's law adds to its
 * straight line at the operating point without the meter. Y, Z and P are columns of the inverse.
 * Where that small system does not converge, or the meter would turn a switch, the whole circuit is
 * solved with the meter in it.
 *
 * Source: L. O. Chua and P.-M. Lin, Computer-Aided Analysis of Electronic Circuits (1975), n-port
 * formulation (from memory). Fails as the operating point does. A compiled circuit is read at once:
 * after changing its values, reduce it again.
 */
export function reduce(
  circuit: Circuit | CompiledCircuit,
  options: EngineOptions = {},
): Result<PortSolver> {
  const made = machineOf(circuit, options);
  if (!made.ok) return made;
  const machine = made.value;
  const failure = solveAtRest(machine, 'rest');
  if (failure !== undefined) return { ok: false, failure };
  for (const junction of machine.junctions) stampDiode(machine.system, junction);
  const column = factor(machine.factors, machine.system.values);
  if (column >= 0) return { ok: false, failure: singular(machine.netlist, column) };
  const ports = junctionPorts(machine);
  const inner = createPortNewton(machine, ports);
  return {
    ok: true,
    value: {
      probe: (red, black, meter) =>
        probeReduced(machine, ports, inner, [red, black], meter) ??
        probeWhole(machine, [red, black], meter, options),
    },
  };
}

function machineOf(circuit: Circuit | CompiledCircuit, options: EngineOptions): Result<Machine> {
  if ('machine' in circuit) return { ok: true, value: circuit.machine };
  return createMachine(circuit, 'steady', options);
}

function probeReduced(
  machine: Machine,
  ports: JunctionPorts,
  inner: PortNewton,
  pair: readonly [NodeName, NodeName],
  meter: MeterPort,
): Result<PortReading> | undefined {
  const { netlist, system, factors } = machine;
  const red = netlist.nodeIndex.get(pair[0]);
  const black = netlist.nodeIndex.get(pair[1]);
  if (red === undefined || black === undefined || !(meter.sourceResistance > 0)) return undefined;
  const { residual, step } = system;
  residual.fill(0);
  residual[red] = REFERENCE;
  residual[black] = black === red ? 0 : -REFERENCE;
  residual[netlist.size] = 0;
  if (red === black) residual[red] = 0;
  solveFactored(factors, residual, step);
  step[netlist.size] = 0;
  const across = step[red]! - step[black]!;
  const open = system.x[red]! - system.x[black]!;
  const loop = meter.sourceResistance + across;
  const solved = inner.solve(red, black, (meter.openVolts - open) / loop, loop);
  if (!solved) return undefined;
  const { amps, volts } = solved;
  if (!ports.keepsSwitches(amps, step, inner.excess)) return undefined;
  return { ok: true, value: { volts: open + across * amps + volts, amps } };
}

/** The whole circuit solved with the meter in it, as a current beside its resistance: no node is added. */
function probeWhole(
  machine: Machine,
  [red, black]: readonly [NodeName, NodeName],
  { openVolts, sourceResistance }: MeterPort,
  options: EngineOptions,
): Result<PortReading> {
  const wave = { shape: 'dc', value: openVolts / sourceResistance } as const;
  const added: Element[] = [
    { kind: 'resistor', name: 'in the meter', nodes: [red, black], resistance: sourceResistance },
    { kind: 'current-source', name: 'of the meter', nodes: [black, red], wave },
  ];
  const solved = operatingPoint(
    { elements: [...presentCircuit(machine).elements, ...added] },
    options,
  );
  if (!solved.ok) return solved;
  const volts = solved.value.voltages[red]! - solved.value.voltages[black]!;
  return { ok: true, value: { volts, amps: (openVolts - volts) / sourceResistance } };
}

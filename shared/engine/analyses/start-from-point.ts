import type {
  Circuit,
  Element,
  EngineFailure,
  NodeName,
  OperatingPoint,
} from '../circuit/circuit.ts';
import type { Integrator } from './integrator.ts';
import { REFERENCE } from '../stamping/system.ts';
import { createMachine, type EngineOptions, type Machine } from './machine.ts';
import { solveAtRest } from './operating-point.ts';
import { readPoint } from './read-point.ts';
import { loadStorage } from './storage.ts';

/** Ohm; holds a node at its told voltage while the starting point is found, as a stiff source would. */
const HOLDING_RESISTANCE = 1e-6;

/**
 * Starts the integrator from the operating point with the sources as they are at t = 0, nodes of
 * `initialVoltages` (V) being held at those while it is found and let go afterwards.
 */
export function startFromPoint(
  integrator: Integrator,
  circuit: Circuit,
  options: EngineOptions & { initialVoltages?: Readonly<Record<NodeName, number>> },
): EngineFailure | undefined {
  const held = withHeldNodes(circuit, options.initialVoltages ?? {});
  const made = createMachine(held, 'steady', options);
  if (!made.ok) return made.failure;
  const failure = solveAtRest(made.value, 'start');
  if (failure !== undefined) return failure;
  const point = readPoint(made.value);
  const voltages: Record<string, number> = {};
  for (const { branch } of integrator.machine.capacitors) {
    const { name, nodes } = integrator.machine.netlist.branches[branch]!;
    voltages[name] = point.voltages[nodes[0]]! - point.voltages[nodes[1]]!;
  }
  loadStorage(integrator, { voltages, currents: point.currents });
  takeOver(integrator.machine, point);
  integrator.machine.switches.forEach((state, at) => (state.isOn = made.value.switches[at]!.isOn));
  return undefined;
}

/** Leaves the point as the machine's own solution. */
function takeOver({ netlist, system }: Machine, point: OperatingPoint): void {
  netlist.nodeNames.forEach((name, node) => (system.x[node] = point.voltages[name]!));
  netlist.branches.forEach(({ name }, k) => {
    system.x[netlist.nodeCount + k] = point.currents[name]! * REFERENCE;
  });
}

function withHeldNodes(circuit: Circuit, initial: Readonly<Record<NodeName, number>>): Circuit {
  const holds = Object.entries(initial).flatMap(([node, volts]): Element[] => {
    const name = `hold of ${node}`;
    const wave = { shape: 'dc', value: volts } as const;
    return [
      { kind: 'voltage-source', name, nodes: [name, '0'], wave },
      { kind: 'resistor', name: `${name} by`, nodes: [name, node], resistance: HOLDING_RESISTANCE },
    ];
  });
  return holds.length === 0 ? circuit : { elements: [...circuit.elements, ...holds] };
}

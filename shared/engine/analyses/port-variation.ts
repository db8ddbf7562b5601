import type { CircuitChange } from '../circuit/circuit-change.ts';
import type { Circuit, NodeName, Result } from '../circuit/circuit.ts';
import { stampDiode } from '../devices/diode.ts';
import { factor } from '../linear/factors.ts';
import type { CompiledCircuit } from './compile.ts';
import { createGraft, fillGraft } from './graft.ts';
import { bendJunctions, createGraftedJunctions, takeJunctions } from './grafted-junctions.ts';
import type { GraftedSystem } from './grafted-system.ts';
import { differenceIn, solveGrafted, systemOf, writeSystem } from './grafted-system.ts';
import { junctionPorts } from './junction-ports.ts';
import { createMachine, singular, type EngineOptions, type Machine } from './machine.ts';
import { solveAtRest } from './operating-point.ts';
import { createPortColumns } from './port-columns.ts';
import type { MeterPort, PortReading } from './port-reduction.ts';

/** A circuit solved once, to be asked by meters after one change or another. */
export interface Variations {
  /**
   * Makes this change in place of the one before. False where it cannot be grafted on: the changed
   * circuit has to be reduced whole.
   */
  vary(change: CircuitChange): boolean;
  /**
   * What a meter at this pair of the unchanged circuit's nodes sees with the change made. Undefined
   * where the small system has no answer (a node that is not there, a junction that will not settle).
   */
  probe(red: NodeName, black: NodeName, meter: MeterPort): PortReading | undefined;
}

/**
 * Solves a circuit at rest once, so that what a meter sees after a change of a few elements costs a
 * system as small as the change: hundreds of faults of one oven on one bench share one factorisation
 * and one triangular solve for each place they touch.
 *
 * With x_p the old circuit's answer to 1 A into the pair and w the change's own unknowns
 * (`grafted-system.ts`), v_p = v_p0 + Z_pp i + sum_j P_j d_j as in `port-reduction.ts`, all of it
 * with w in it. New nodes have no conductance to ground: 1e-12 S less than a whole solution has.
 * Fails as the operating point does.
 */
export function variations(
  circuit: Circuit | CompiledCircuit,
  options: EngineOptions = {},
): Result<Variations> {
  const made =
    'machine' in circuit
      ? ({ ok: true, value: circuit.machine } as const)
      : createMachine(circuit, 'steady', options);
  if (!made.ok) return made;
  const machine = made.value;
  const failure = solveAtRest(machine, 'rest');
  if (failure !== undefined) return { ok: false, failure };
  for (const junction of machine.junctions) stampDiode(machine.system, junction);
  const column = factor(machine.factors, machine.system.values);
  if (column >= 0) return { ok: false, failure: singular(machine.netlist, column) };
  return { ok: true, value: variationsOf(machine, options) };
}

function variationsOf(machine: Machine, options: EngineOptions): Variations {
  const { netlist, system } = machine;
  const { nodeCount, nodeIndex } = netlist;
  const columns = createPortColumns(machine);
  const graft = createGraft();
  const junctions = createGraftedJunctions(machine, junctionPorts(machine), graft);
  const rooms: (GraftedSystem | undefined)[] = [];
  const open = system.x.slice();
  let grafted: GraftedSystem | undefined;
  let atRest = new Float64Array(0);
  let w = new Float64Array(0);

  const vary = (change: CircuitChange): boolean => {
    grafted = undefined;
    if (machine.switches.length > 0) return false;
    if (!fillGraft(graft, machine, columns, change, options)) return false;
    const made = systemOf(rooms, graft);
    writeSystem(made, graft, nodeCount);
    if (atRest.length !== made.size) {
      atRest = new Float64Array(made.size);
      w = new Float64Array(made.size);
    }
    if (!solveGrafted(made, graft, nodeCount, open, -1, atRest)) return false;
    takeJunctions(junctions, made, open, atRest);
    grafted = made;
    return true;
  };

  const probe: Variations['probe'] = (redNode, blackNode, meter) => {
    const red = nodeIndex.get(redNode);
    const black = nodeIndex.get(blackNode);
    if (grafted === undefined || red === undefined || black === undefined) return undefined;
    if (!(meter.sourceResistance > 0)) return undefined;
    const pair = columns.pair(red, black);
    if (!solveGrafted(grafted, graft, nodeCount, pair, -1, w)) return undefined;
    const standing = differenceIn(graft, open, atRest, red, black);
    const across = differenceIn(graft, pair, w, red, black);
    const loop = meter.sourceResistance + across;
    const amps = (meter.openVolts - standing) / loop;
    const bent = bendJunctions(junctions, { red, black, pair, w, amps, loop });
    if (bent === undefined) return undefined;
    const driven = amps - bent / loop;
    return { volts: standing + across * driven + bent, amps: driven };
  };
  return { vary, probe };
}

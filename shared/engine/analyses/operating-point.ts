import type { Circuit, EngineFailure, OperatingPoint, Result } from '../circuit/circuit.ts';
import { linearise } from '../devices/diode-law.ts';
import { stampSwitch, switchOverdrive } from '../devices/switch.ts';
import { restart } from '../linear/factors.ts';
import { setGroundConductance } from '../stamping/system.ts';
import { createMachine, singular, type EngineOptions, type Machine } from './machine.ts';
import { newton, notConverged, type NewtonOutcome } from './newton.ts';
import { readPoint } from './read-point.ts';
import { setSources, type Moment } from './set-sources.ts';
import { stampAtRest } from './stamp-at-rest.ts';

/**
 * The circuit with nothing changing: capacitors open, inductors their series resistance, sources at
 * their direct value. Voltages in V, currents in A of every element but couplings and current sources.
 *
 * Fails with bad-element, voltage-loop, floating-node (a current driven where there is no way back)
 * or not-converged. A node with no path to ground is legal: 1e-12 S holds it.
 */
export function operatingPoint(
  circuit: Circuit,
  options: EngineOptions = {},
): Result<OperatingPoint> {
  const made = createMachine(circuit, 'steady', options);
  if (!made.ok) return made;
  const failure = solveAtRest(made.value, 'rest');
  return failure === undefined
    ? { ok: true, value: readPoint(made.value) }
    : { ok: false, failure };
}

/** Solves from nothing, sources as at `moment`; leaves the solution in the machine. */
export function solveAtRest(machine: Machine, moment: Moment): EngineFailure | undefined {
  forget(machine);
  stampAtRest(machine.system, machine);
  return solveWithSwitches(machine, moment);
}

/** Back to a state that no earlier solution has touched. */
export function forget(machine: Machine): void {
  restart(machine.factors);
  machine.system.isStale = true;
  machine.voltageNoise = 0;
  fromNothing(machine);
  for (const state of machine.switches) {
    const element = machine.netlist.branches[state.branch]!;
    state.isOn = element.kind === 'switch' && (element.isInitiallyOn ?? false);
  }
}

const MOST_TURNS = 50;

/** Solves from the present state, turning switches until each agrees with its control. */
export function solveWithSwitches(machine: Machine, moment: Moment): EngineFailure | undefined {
  const { system, switches, netlist } = machine;
  let restless = switches[0];
  for (let turn = 0; turn < MOST_TURNS; turn += 1) {
    const failure = solveRobustly(machine, moment);
    if (failure !== undefined) return failure;
    const turning = switches.filter((state) => switchOverdrive(system, state) > 0);
    if (turning.length === 0) return undefined;
    restless = turning[0];
    for (const state of turning) {
      state.isOn = !state.isOn;
      stampSwitch(system, state);
    }
  }
  const name = restless === undefined ? '' : netlist.branches[restless.branch]!.name;
  const node = netlist.nodeNames[restless?.controlFrom ?? -1] ?? '0';
  const message = `${name} has no state that its control agrees with`;
  const residual = restless === undefined ? 0 : Math.abs(switchOverdrive(system, restless));
  return { code: 'not-converged', node, iteration: MOST_TURNS, residual, message };
}

/** Newton's method, then conductance to ground taken off by decades, then sources put up by steps. */
function solveRobustly(machine: Machine, moment: Moment): EngineFailure | undefined {
  setSources(machine, moment);
  let outcome = newton(machine);
  if (outcome.isSolved) return undefined;
  outcome = steppingConductance(machine);
  if (outcome.isSolved) return undefined;
  outcome = steppingSources(machine, moment);
  if (outcome.isSolved) return undefined;
  return outcome.singularColumn >= 0
    ? singular(machine.netlist, outcome.singularColumn)
    : notConverged(machine, outcome.iterations);
}

function fromNothing(machine: Machine): void {
  machine.system.x.fill(0);
  for (const junction of machine.junctions) linearise(junction, 0);
}

function steppingConductance(machine: Machine): NewtonOutcome {
  const { system, baseConductance } = machine;
  fromNothing(machine);
  let outcome: NewtonOutcome = { isSolved: false, iterations: 0, singularColumn: -1 };
  for (let extra = 1e-2; extra > Math.max(baseConductance, 1e-13); extra /= 10) {
    setGroundConductance(system, baseConductance + extra);
    outcome = newton(machine);
    if (!outcome.isSolved) break;
  }
  setGroundConductance(system, baseConductance);
  return outcome.isSolved ? newton(machine) : outcome;
}

function steppingSources(machine: Machine, moment: Moment): NewtonOutcome {
  const { system } = machine;
  fromNothing(machine);
  let outcome: NewtonOutcome = { isSolved: false, iterations: 0, singularColumn: -1 };
  let reached = 0;
  let stride = 0.1;
  while (reached < 1 && stride > 1e-4) {
    const next = Math.min(1, reached + stride);
    const voltages = machine.junctions.map((junction) => junction.voltage);
    const kept = system.x.slice();
    setSources(machine, moment, next);
    outcome = newton(machine);
    if (outcome.isSolved) {
      reached = next;
      stride *= 2;
    } else {
      stride /= 4;
      system.x.set(kept);
      machine.junctions.forEach((junction, j) => linearise(junction, voltages[j]!));
    }
  }
  setSources(machine, moment);
  return outcome;
}

import type { EngineFailure } from '../circuit/circuit.ts';
import { capacitorRate, setCapacitorHistory } from '../devices/capacitor.ts';
import { linearise } from '../devices/diode-law.ts';
import { inductorRate, setInductorHistory } from '../devices/inductor.ts';
import type { Tableau } from '../integration/tableau.ts';
import { solveFactored } from '../linear/factors.ts';
import { REFERENCE } from '../stamping/system.ts';
import type { Machine } from './machine.ts';
import { newton } from './newton.ts';
import { solveWithSwitches } from './operating-point.ts';
import { setSources } from './set-sources.ts';
import { stampFixed } from './stamp-at-rest.ts';
import { stampStage } from './stamp-stage.ts';

/**
 * A circuit in motion. The state is the voltage of each capacitor, then the flux of each inductor
 * (V, V s), in the machine's order; a step solves the stages of the tableau one after another.
 */
export interface Integrator {
  readonly machine: Machine;
  readonly tableau: Tableau;
  readonly state: Float64Array;
  readonly nextState: Float64Array;
  /** dy/dt by stage; the first is that of the state itself */ readonly rates: Float64Array[];
  /** the solution at the start of the step, to fall back to */ readonly startX: Float64Array;
  readonly startJunctions: Float64Array;
  /** S of each junction there */ readonly startConductances: Float64Array;
  /** A of each inductor at the start of the step */ readonly startCurrents: Float64Array;
  readonly history: Float64Array;
  /** largest size each voltage (V) and current (A) has had so far */ readonly sizes: Float64Array;
  /** called after each stage but the first, with its number, while its solution stands */
  onStage?: (stage: number) => void;
}

/**
 * s. The stage that finds the moment after a break, and the shortest step: what is quicker (picofarads
 * behind milliohms) is damped and not followed. Shorter, and the change of a flux would have no
 * digits left beside the flux. What it moves is the charge of capacitors joined without resistance.
 */
export const INSTANT = 1e-12;

/** Junctions within a stage: half its square is the current's relative error. */
const STAGE_TOLERANCE = 1e-4;
const STAGE_ITERATIONS = 40;
/** Each round then still takes off nineteen twentieths of what is wrong. */
const STAGE_SLACK = 0.05;

export function createIntegrator(machine: Machine, tableau: Tableau): Integrator {
  const count = machine.capacitors.length + machine.inductors.length;
  return {
    machine,
    tableau,
    state: new Float64Array(count),
    nextState: new Float64Array(count),
    rates: Array.from({ length: tableau.stages }, () => new Float64Array(count)),
    startX: machine.system.x.slice(),
    startJunctions: new Float64Array(machine.junctions.length),
    startConductances: new Float64Array(machine.junctions.length),
    startCurrents: new Float64Array(machine.inductors.length),
    history: new Float64Array(count),
    sizes: new Float64Array(count),
  };
}

/** Finds the moment just after `time`: switches agree, rates are known, nothing else has moved. */
export function settle(integrator: Integrator, time: number): EngineFailure | undefined {
  const { machine, state, history, rates } = integrator;
  stampFixed(machine.system, machine);
  stampStage(machine.system, machine, INSTANT);
  history.set(state);
  setHistory(integrator, INSTANT);
  const failure = solveWithSwitches(machine, time);
  if (failure !== undefined) return failure;
  readRates(integrator, rates[0]!, INSTANT);
  for (let j = 0; j < state.length; j += 1) state[j]! += INSTANT * rates[0]![j]!;
  keepStart(integrator);
  return undefined;
}

/**
 * Tries a step of `length` s; false when a stage has no solution. Leaves the end's solution in the
 * machine. `middle` is the time halfway between the breaks: before it the sources are taken just
 * after their corners, beyond it just before.
 */
export function tryStep(
  integrator: Integrator,
  time: number,
  length: number,
  middle: number,
): boolean {
  const { machine, tableau, state, nextState, history, rates } = integrator;
  const { stages, gamma, a, c } = tableau;
  stampStage(machine.system, machine, length * gamma);
  for (let stage = 1; stage < stages; stage += 1) {
    history.set(state);
    const weights = a[stage]!;
    for (let earlier = 0; earlier < stage; earlier += 1) {
      const weight = length * weights[earlier]!;
      const rate = rates[earlier]!;
      for (let j = 0; j < history.length; j += 1) history[j]! += weight * rate[j]!;
    }
    setHistory(integrator, length * gamma);
    const moment = time + c[stage]! * length;
    setSources(machine, moment, 1, moment < middle ? 1 : -1);
    if (!newton(machine, STAGE_TOLERANCE, STAGE_ITERATIONS, STAGE_SLACK).isSolved) return false;
    readRates(integrator, rates[stage]!, length * gamma);
    integrator.onStage?.(stage);
  }
  const last = rates[stages - 1]!;
  for (let j = 0; j < state.length; j += 1) {
    nextState[j] = history[j]! + length * gamma * last[j]!;
  }
  return true;
}

/** Makes the end of the step just tried the start of the next. */
export function acceptStep(integrator: Integrator): void {
  const { state, nextState, rates, tableau } = integrator;
  state.set(nextState);
  rates[0]!.set(rates[tableau.stages - 1]!);
  keepStart(integrator);
}

/** S; a junction below this carries nothing that a winding would notice losing. */
const CONDUCTING = 1e-6;

/**
 * Whether a junction in the step just tried has turned on or off. The current of a winding then has
 * a corner inside the step, and the method's own idea of its voltage at the end is of no use.
 */
export function hasJunctionTurned({ machine, startConductances }: Integrator): boolean {
  if (machine.inductors.length === 0) return false;
  return machine.junctions.some(({ conductance }, j) => {
    const before = startConductances[j]!;
    const greater = Math.max(before, conductance);
    return greater > CONDUCTING && Math.min(before, conductance) < 1e-3 * greater;
  });
}

/** Goes back to the start of the step just tried. */
export function refuseStep({ machine, startX, startJunctions }: Integrator): void {
  machine.system.x.set(startX);
  for (let j = 0; j < startJunctions.length; j += 1) {
    linearise(machine.junctions[j]!, startJunctions[j]!);
  }
}

function keepStart(integrator: Integrator): void {
  const { machine, state, sizes, startX, startJunctions, startCurrents } = integrator;
  const base = machine.capacitors.length;
  startX.set(machine.system.x);
  for (let j = 0; j < startJunctions.length; j += 1) {
    startJunctions[j] = machine.junctions[j]!.voltage;
    integrator.startConductances[j] = machine.junctions[j]!.conductance;
  }
  for (let j = 0; j < startCurrents.length; j += 1) {
    startCurrents[j] = inductorCurrent(machine, j);
    sizes[base + j] = Math.max(sizes[base + j]!, Math.abs(startCurrents[j]!));
  }
  for (let j = 0; j < base; j += 1) sizes[j] = Math.max(sizes[j]!, Math.abs(state[j]!));
}

/** A through an inductor in the machine's present solution. */
export function inductorCurrent({ system, netlist, inductors }: Machine, j: number): number {
  return system.x[netlist.nodeCount + inductors[j]!.branch]! / REFERENCE;
}

function setHistory({ machine, history }: Integrator, length: number): void {
  const { system, capacitors, inductors } = machine;
  for (let j = 0; j < capacitors.length; j += 1) {
    setCapacitorHistory(system, capacitors[j]!.branch, history[j]!);
  }
  let largest = 0;
  for (let j = 0; j < inductors.length; j += 1) {
    const flux = history[capacitors.length + j]!;
    setInductorHistory(system, inductors[j]!.branch, flux, length);
    largest = Math.max(largest, Math.abs(flux));
  }
  machine.voltageNoise = (8 * Number.EPSILON * largest) / length;
}

function readRates(integrator: Integrator, rate: Float64Array, length: number): void {
  const { machine, history } = integrator;
  const { system, netlist, capacitors, inductors, mutuals, windings } = machine;
  const base = capacitors.length;
  for (let j = 0; j < base; j += 1) {
    rate[j] = capacitorRate(system, capacitors[j]!.branch, capacitors[j]!.value);
  }
  for (let j = 0; j < inductors.length; j += 1) {
    rate[base + j] = inductors[j]!.value * inductorCurrent(machine, j);
  }
  for (let c = 0; c < mutuals.length; c += 1) {
    const first = windings[2 * c]!;
    const second = windings[2 * c + 1]!;
    rate[base + first]! += mutuals[c]! * inductorCurrent(machine, second);
    rate[base + second]! += mutuals[c]! * inductorCurrent(machine, first);
  }
  // d(flux)/dt two ways: by the flux where that is well known, by the voltages where the stage is
  // so short that the flux has no digits left for its change
  for (let j = 0; j < inductors.length; j += 1) {
    const { branch, resistance } = inductors[j]!;
    const flux = rate[base + j]!;
    const a = system.x[netlist.from[branch]!]!;
    const b = system.x[netlist.to[branch]!]!;
    const isFluxSure = Math.abs(flux) < length * (Math.abs(a) + Math.abs(b));
    rate[base + j] = isFluxSure
      ? (flux - history[base + j]!) / length
      : inductorRate(system, branch, resistance);
  }
}

/**
 * The largest estimated error of the step just tried, as a share of what is allowed. The estimate
 * e = h sum (b - bHat) k is taken through (1 - h gamma J)^-1, one more solve with the stages' own
 * factors, so that a stiff part that has settled does not hold the step down.
 * Source: L. F. Shampine, in Hosea and Shampine (1996), as TR-BDF2's estimate.
 */
export function stepError(integrator: Integrator, length: number, relative: number): number {
  const { machine, tableau, rates, history, state, nextState, startCurrents, sizes } = integrator;
  const { system, netlist, factors, capacitors, inductors } = machine;
  const { residual, step, alpha } = system;
  history.fill(0);
  for (let stage = 0; stage < tableau.stages; stage += 1) {
    const weight = length * tableau.errorWeights[stage]!;
    for (let j = 0; j < history.length; j += 1) history[j]! += weight * rates[stage]![j]!;
  }
  residual.fill(0);
  for (let j = 0; j < capacitors.length; j += 1) {
    const { branch } = capacitors[j]!;
    residual[netlist.nodeCount + branch] = alpha[branch]! * history[j]!;
  }
  for (let j = 0; j < inductors.length; j += 1) {
    const { branch } = inductors[j]!;
    const flux = history[capacitors.length + j]!;
    residual[netlist.nodeCount + branch] = (-alpha[branch]! * flux) / (length * tableau.gamma);
  }
  solveFactored(factors, residual, step);
  step[netlist.size] = 0;
  let worst = 0;
  for (let j = 0; j < capacitors.length; j += 1) {
    const { branch } = capacitors[j]!;
    const error = Math.abs(step[netlist.from[branch]!]! - step[netlist.to[branch]!]!);
    const size = Math.max(Math.abs(state[j]!), Math.abs(nextState[j]!), MEMORY * sizes[j]!);
    worst = Math.max(worst, error / (ABSOLUTE_VOLTS + relative * size));
  }
  for (let j = 0; j < inductors.length; j += 1) {
    const error = Math.abs(step[netlist.nodeCount + inductors[j]!.branch]!) / REFERENCE;
    const now = Math.abs(inductorCurrent(machine, j));
    const size = Math.max(Math.abs(startCurrents[j]!), now, MEMORY * sizes[capacitors.length + j]!);
    worst = Math.max(worst, error / (ABSOLUTE_AMPERES + relative * size));
  }
  return Number.isNaN(worst) ? Infinity : worst;
}

/** A current that has fallen to a ten-thousandth of what it was need not keep all its digits. */
const MEMORY = 1e-4;
/** A thousandth of the last digit of the lowest direct-voltage range of a 2000-count meter. */
export const ABSOLUTE_VOLTS = 1e-7;
/** What puts that voltage across 100 kOhm. */
export const ABSOLUTE_AMPERES = 1e-12;

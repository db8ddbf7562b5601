import type { EngineFailure } from '../circuit/circuit.ts';
import { linearise } from '../devices/diode-law.ts';
import { inductorCurrent } from './inductor-current.ts';
import type { Integrator } from './integrator.ts';
import { newton } from './newton.ts';
import { solveWithSwitches } from './operating-point.ts';
import { setSources } from './set-sources.ts';
import { readRates, setHistory } from './stage-rates.ts';
import { stampFixed } from './stamp-at-rest.ts';
import { stampStage } from './stamp-stage.ts';

/**
 * s. The stage that finds the moment after a break, and the shortest step: what is quicker (picofarads
 * behind milliohms) is damped and not followed. Shorter, and the change of a flux would have no
 * digits left beside the flux. What it moves is the charge of capacitors joined without resistance.
 */
export const INSTANT = 1e-12;

/** Junctions within a stage, where steps are not looser themselves: half its square is the current's relative error. */
const STAGE_TOLERANCE = 1e-4;
const STAGE_ITERATIONS = 40;
/** Each round then still takes off nine tenths of what is wrong. */
const STAGE_SLACK = 0.1;

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
  integrator.rateNoise = machine.voltageNoise;
  keepStart(integrator);
  return undefined;
}

/**
 * Tries a step of `length` s; false when a stage has no solution. Leaves the end's solution in the
 * machine. `middle` is the time halfway between the breaks: before it the sources are taken just
 * after their corners, beyond it just before. Junctions are found as closely as a step may err.
 */
export function tryStep(
  integrator: Integrator,
  time: number,
  length: number,
  middle: number,
  relativeTolerance: number,
): boolean {
  const { machine, tableau, state, nextState, history, rates } = integrator;
  const { stages, gamma, a, c } = tableau;
  const tolerance = Math.max(STAGE_TOLERANCE, relativeTolerance);
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
    if (!newton(machine, tolerance, STAGE_ITERATIONS, STAGE_SLACK).isSolved) return false;
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
  integrator.rateNoise = integrator.machine.voltageNoise;
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

import { solveFactored } from '../linear/factors.ts';
import { REFERENCE } from '../stamping/system.ts';
import { inductorCurrent } from './inductor-current.ts';
import type { Integrator } from './integrator.ts';

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
  ignoreNoise(integrator, length);
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

/** Takes off the estimate what rounding alone puts on it: perfect coupling turns that into current. */
function ignoreNoise({ machine, tableau, history, rateNoise }: Integrator, length: number): void {
  const { errorWeights } = tableau;
  let noise = Math.abs(errorWeights[0]!) * rateNoise;
  for (let stage = 1; stage < errorWeights.length; stage += 1) {
    noise += Math.abs(errorWeights[stage]!) * machine.voltageNoise;
  }
  for (let j = machine.capacitors.length; j < history.length; j += 1) {
    const size = Math.max(0, Math.abs(history[j]!) - length * noise);
    history[j] = Math.sign(history[j]!) * size;
  }
}

/** A current that has fallen to a ten-thousandth of what it was need not keep all its digits. */
const MEMORY = 1e-4;
/** A thousandth of the last digit of the lowest direct-voltage range of a 2000-count meter. */
export const ABSOLUTE_VOLTS = 1e-7;
/** What puts that voltage across 100 kOhm. */
export const ABSOLUTE_AMPERES = 1e-12;

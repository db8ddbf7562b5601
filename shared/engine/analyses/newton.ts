import type { EngineFailure } from '../circuit/circuit.ts';
import { linearise } from '../devices/diode-law.ts';
import { junctionVoltage, stampDiode } from '../devices/diode.ts';
import { limitJunction } from '../devices/junction-limit.ts';
import { factor, solveFactored } from '../linear/factors.ts';
import { computeResidual } from '../stamping/residual.ts';
import { REFERENCE } from '../stamping/system.ts';
import type { Machine } from './machine.ts';

/**
 * Newton's method on the whole circuit: the junctions are made linear about their last voltages,
 * A dx = residual is solved, and x + dx gives the next voltages, limited. The step is solved from
 * the residual, so every round also refines what rounding spoilt in the one before.
 * Ends when no junction moves by more than `tolerance` thermal slopes, which leaves a relative error
 * of half its square in the current.
 */
export type NewtonOutcome =
  | { isSolved: true; iterations: number }
  | { isSolved: false; iterations: number; singularColumn: number };

/** The junction law's error at this tolerance is 5e-13 of the current. */
export const EXACT = 1e-6;
const MOST_ITERATIONS = 100;
const MOST_REFINEMENTS = 4;
/** Of the largest current at a node; a tenth of what is promised. */
const KIRCHHOFF = 1e-10;

/**
 * Solves from the present x and junction voltages; `slack` lets junctions keep a line in the matrix
 * that is nearly right. Nothing is allocated but the outcome.
 */
export function newton(
  machine: Machine,
  tolerance: number = EXACT,
  mostIterations: number = MOST_ITERATIONS,
  slack: number = 0,
): NewtonOutcome {
  const { system, factors, junctions } = machine;
  let iterations = 0;
  for (;;) {
    iterations += 1;
    for (let j = 0; j < junctions.length; j += 1) stampDiode(system, junctions[j]!, slack);
    if (system.isStale) {
      const singularColumn = factor(factors, system.values);
      if (singularColumn >= 0) return { isSolved: false, iterations, singularColumn };
      system.isStale = false;
    }
    computeResidual(system);
    advanceSolution(machine);
    const moved = moveJunctions(machine);
    if (moved <= tolerance) break;
    if (iterations >= mostIterations || Number.isNaN(moved)) {
      return { isSolved: false, iterations, singularColumn: -1 };
    }
  }
  return refine(machine)
    ? { isSolved: true, iterations }
    : { isSolved: false, iterations, singularColumn: -1 };
}

/** x += A^-1 residual. */
function advanceSolution({ system, factors }: Machine): void {
  const { x, step, residual, netlist } = system;
  solveFactored(factors, residual, step);
  for (let at = 0; at < netlist.size; at += 1) x[at]! += step[at]!;
}

/**
 * Makes every junction linear about its new voltage; the largest move, in thermal slopes. A move
 * counts by what it does to the current, g dv / (|i| + IS): that is dv / slope in a junction that
 * conducts, and nothing in one that is cut off, however far its voltage goes.
 */
function moveJunctions({ system, junctions, voltageNoise }: Machine): number {
  let largest = 0;
  for (let j = 0; j < junctions.length; j += 1) {
    const junction = junctions[j]!;
    const before = junction.conductance;
    const wanted = junctionVoltage(system, junction);
    const next = limitJunction(junction, wanted);
    const moved = Math.max(0, Math.abs(next - junction.voltage) - voltageNoise);
    if (Number.isNaN(moved)) return NaN;
    linearise(junction, next);
    const conductance = Math.max(before, junction.conductance);
    const share = conductance / (Math.abs(junction.current) + junction.saturation);
    largest = Math.max(largest, moved * share, Math.abs(wanted - next) / junction.slope);
  }
  return largest;
}

/** Repeats the solve with the same factors until Kirchhoff's current law holds; false if it will not. */
function refine(machine: Machine): boolean {
  const { system } = machine;
  let last = Infinity;
  for (let round = 0; round <= MOST_REFINEMENTS; round += 1) {
    computeResidual(system);
    const worst = currentLawError(machine);
    if (worst <= KIRCHHOFF) return true;
    if (Number.isNaN(worst) || worst > 0.5 * last) return worst < 10 * KIRCHHOFF;
    last = worst;
    advanceSolution(machine);
  }
  computeResidual(system);
  return currentLawError(machine) < 10 * KIRCHHOFF;
}

/**
 * The largest error of Kirchhoff's current law, over all nodes, as a share of the largest current
 * at that node. Expects the residual to be fresh.
 */
export function currentLawError(machine: Machine): number {
  const { system, netlist } = machine;
  const { nodeCount, from, to } = netlist;
  const { x, residual, injected, largest } = system;
  const ground = system.groundConductance * REFERENCE;
  for (let node = 0; node < nodeCount; node += 1) {
    largest[node] = Math.max(Math.abs(injected[node]!), ground * Math.abs(x[node]!));
  }
  for (let k = 0; k < from.length; k += 1) {
    const current = Math.abs(x[nodeCount + k]!);
    if (current > largest[from[k]!]!) largest[from[k]!] = current;
    if (current > largest[to[k]!]!) largest[to[k]!] = current;
  }
  let worst = 0;
  for (let node = 0; node < nodeCount; node += 1) {
    const error = Math.abs(residual[node]!);
    if (error > NOTHING && error > worst * largest[node]!) worst = error / largest[node]!;
    if (Number.isNaN(error)) return NaN;
  }
  return worst;
}

/** In the system's current unit: below 1e-35 A there is nothing to be right about. */
const NOTHING = 1e-30;

/** The failure that says where Newton's method stood when it was given up. */
export function notConverged(machine: Machine, iteration: number, time?: number): EngineFailure {
  const { netlist, system } = machine;
  let worst = 0;
  for (let node = 1; node < netlist.nodeCount; node += 1) {
    if (!(Math.abs(system.step[node]!) <= Math.abs(system.step[worst]!))) worst = node;
  }
  const node = netlist.nodeNames[worst] ?? '0';
  const step = system.step[worst]!;
  const residual = Number.isFinite(step) ? Math.abs(step) : Number.MAX_VALUE;
  const when = time === undefined ? '' : ` at ${time} s`;
  const message = `no solution found${when}: node ${node} still moves by ${residual} V`;
  return {
    code: 'not-converged',
    node,
    iteration,
    residual,
    ...(time === undefined ? {} : { time }),
    message,
  };
}

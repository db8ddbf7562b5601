import type { NodeName } from '../circuit/circuit.ts';
import { setCapacitorHistory } from '../devices/capacitor.ts';
import { setInductorHistory } from '../devices/inductor.ts';
import { createFactors, factor, solveFactored, type Factors } from '../linear/factors.ts';
import { createSystem, type System } from '../stamping/system.ts';
import type { Integrator } from './integrator.ts';
import type { Machine } from './machine.ts';
import type { Watch } from './march.ts';
import { setSourceSlopes } from './set-source-slopes.ts';
import { stampFixed } from './stamp-at-rest.ts';
import { stampStage } from './stamp-stage.ts';
import { INSTANT } from './steps.ts';

/** Sampled voltages: values[p] are those of the p-th pair, one for each time. */
export interface Trace {
  time: number[];
  values: number[][];
}

export interface PairRecorder {
  readonly trace: Trace;
  readonly watch: Watch;
  /** mean of each pair over `duration` s */ means(duration: number): number[];
}

interface Moment {
  readonly time: number;
  readonly values: Float64Array;
  readonly slopes: Float64Array;
}

interface Ends {
  readonly a: Int32Array;
  readonly b: Int32Array;
}

/**
 * Samples pairs of nodes along the steps. Steps are far apart where little happens, so the curve
 * between two ends is taken as the cubic with their values and slopes (C. Hermite's), and points are
 * put in until straight lines follow it. Slopes come from the circuit itself: with capacitors'
 * voltages and inductors' fluxes changing at their known rates, every node's rate is one more solve.
 * A node that is not in the circuit reads as ground.
 */
export function recordPairs(
  integrator: Integrator,
  pairs: readonly (readonly [NodeName, NodeName])[],
  start: number,
): PairRecorder {
  const { netlist, system } = integrator.machine;
  const end = (which: 0 | 1) =>
    Int32Array.from(pairs, (pair) => netlist.nodeIndex.get(pair[which]) ?? netlist.size);
  const ends = { a: end(0), b: end(1) };
  const trace: Trace = { time: [], values: pairs.map(() => []) };
  const integrals = new Float64Array(pairs.length);
  const slopesAt = pairs.length > 0 ? slopeFinder(integrator, ends) : () => new Float64Array(0);
  const valuesNow = (): Float64Array =>
    Float64Array.from(ends.a, (a, p) => system.x[a]! - system.x[ends.b[p]!]!);
  const put = (time: number, valueOf: (p: number) => number): void => {
    trace.time.push(time);
    trace.values.forEach((values, p) => values.push(valueOf(p)));
  };
  let last: Moment = { time: 0, values: new Float64Array(0), slopes: new Float64Array(0) };
  const watch: Watch = {
    onMoment: (time) => {
      last = { time: time - start, values: valuesNow(), slopes: slopesAt(time, 1) };
      put(last.time, (p) => last.values[p]!);
    },
    onStep: (base, offset, length) => {
      const time = base - start + offset;
      const next = { time, values: valuesNow(), slopes: slopesAt(base + offset, -1) };
      const cubic = (p: number): Cubic => [
        last.values[p]!,
        next.values[p]!,
        length * last.slopes[p]!,
        length * next.slopes[p]!,
      ];
      const count = pairs.reduce((most, _, p) => Math.max(most, pieces(cubic(p))), 1);
      for (let piece = 1; piece < count; piece += 1) {
        const share = piece / count;
        put(time - length * (1 - share), (p) => cubicAt(cubic(p), share));
      }
      put(time, (p) => next.values[p]!);
      integrals.forEach((_, p) => (integrals[p]! += length * cubicMean(cubic(p))));
      last = next;
    },
  };
  const means = (duration: number): number[] =>
    pairs.map((_, p) => (duration > 0 ? integrals[p]! / duration : last.values[p]!));
  return { trace, watch, means };
}

/** Values at both ends, then slopes at both ends times the length. */
type Cubic = readonly [number, number, number, number];

function cubicAt([v0, v1, m0, m1]: Cubic, share: number): number {
  const rest = 1 - share;
  return (
    v0 * (1 + 2 * share) * rest * rest +
    m0 * share * rest * rest +
    v1 * (3 - 2 * share) * share * share -
    m1 * rest * share * share
  );
}

const cubicMean = ([v0, v1, m0, m1]: Cubic): number => (v0 + v1) / 2 + (m0 - m1) / 12;

const LINE_RELATIVE = 5e-5;
const LINE_ABSOLUTE = 1e-6;
const MOST_PIECES = 64;

/** How many straight pieces follow the cubic: the distance falls with the square of their number. */
function pieces([v0, v1, m0, m1]: Cubic): number {
  const bow = Math.abs(m0 - m1) / 8;
  const twist = Math.abs((m0 + m1) / 2 - (v1 - v0)) / 10;
  const allowed = LINE_ABSOLUTE + LINE_RELATIVE * Math.max(Math.abs(v0), Math.abs(v1));
  return Math.min(MOST_PIECES, Math.ceil(Math.sqrt(Math.max(bow, twist) / allowed)));
}

type SlopeFinder = (time: number, side: -1 | 1) => Float64Array;

/** V/s of each pair at a moment the integrator has just reached, `side` of it. */
function slopeFinder(integrator: Integrator, ends: Ends): SlopeFinder {
  const { machine } = integrator;
  const { netlist, factors } = machine;
  const system = createSystem(netlist, machine.baseConductance);
  const own = createFactors(factors.pattern, factors.first.symbolic);
  return (time, side) => {
    stampExactly(system, machine);
    stampStage(system, machine, INSTANT);
    if (!refactored(system, own)) return new Float64Array(ends.a.length);
    setSlopes(integrator, system, time, side);
    solveFactored(own, system.residual, system.step);
    system.step[netlist.size] = 0;
    return Float64Array.from(ends.a, (a, p) => system.step[a]! - system.step[ends.b[p]!]!);
  };
}

/** With each junction at its own slope, leaving the lines that stand in the machine's matrix alone. */
function stampExactly(system: System, machine: Machine): void {
  const lines = machine.junctions.map((junction) => junction.line);
  stampFixed(system, machine);
  machine.junctions.forEach((junction, j) => (junction.line = lines[j]!));
}

function refactored(system: System, factors: Factors): boolean {
  if (!system.isStale) return true;
  if (factor(factors, system.values) >= 0) return false;
  system.isStale = false;
  return true;
}

/** The right-hand side of the rates: what the histories and the sources are doing. */
function setSlopes(integrator: Integrator, system: System, time: number, side: -1 | 1): void {
  const { machine, rates } = integrator;
  const { capacitors, inductors, netlist } = machine;
  system.rho.fill(0);
  setSourceSlopes(machine, system, time, side);
  capacitors.forEach(({ branch }, j) => setCapacitorHistory(system, branch, rates[0]![j]!));
  inductors.forEach(({ branch }, j) => {
    setInductorHistory(system, branch, rates[0]![capacitors.length + j]!, INSTANT);
  });
  for (let node = 0; node < netlist.nodeCount; node += 1) {
    system.residual[node] = system.injected[node]!;
  }
  for (let k = 0; k < system.rho.length; k += 1) {
    system.residual[netlist.nodeCount + k] = system.rho[k]!;
  }
}

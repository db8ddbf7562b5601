import { linearise, type Junction } from '../devices/diode-law.ts';
import { limitJunction } from '../devices/junction-limit.ts';
import { solveDense } from '../linear/dense-lu.ts';
import type { JunctionPorts } from './junction-ports.ts';
import type { Machine } from './machine.ts';
import { EXACT } from './newton.ts';

/**
 * The junctions and the meter, and nothing else. With the meter's current put in,
 *   v_k = base_k + sum_j H_kj d_j(v_j),   H_kj = Z_kj - Y_k P_j / (R + Z_pp),
 *   d_j(v) = law_j(v) - i_j - g_j (v - v_j),
 * solved by Newton's method on v with the junctions limited as in the whole circuit.
 */
export interface PortNewton {
  /** A by which each junction's law departs from its straight line, in the last solution */
  readonly excess: Float64Array;
  /**
   * `amps` is what the meter would drive with straight junctions, `loop` R + Z_pp (Ohm). Expects the
   * response to 1 A into the pair in the machine's step. `volts` is the excess's own share of the
   * pair's voltage. Undefined when it does not converge.
   */
  solve(
    red: number,
    black: number,
    amps: number,
    loop: number,
  ): { amps: number; volts: number } | undefined;
}

const MOST_ITERATIONS = 60;

export function createPortNewton(machine: Machine, ports: JunctionPorts): PortNewton {
  const { junctions, system } = machine;
  const count = junctions.length;
  const now: Junction[] = junctions.map((junction) => ({ ...junction }));
  const y = new Float64Array(count);
  const p = new Float64Array(count);
  const base = new Float64Array(count);
  const h = new Float64Array(count * count);
  const jacobian = new Float64Array(count * count);
  const move = new Float64Array(count);
  const excess = new Float64Array(count);

  const prepare = (red: number, black: number, amps: number, loop: number): void => {
    for (let k = 0; k < count; k += 1) {
      y[k] = ports.read(system.step, k);
      p[k] = ports.responses[k]![red]! - ports.responses[k]![black]!;
      base[k] = ports.open[k]! + y[k]! * amps;
      linearise(now[k]!, junctions[k]!.voltage);
      excess[k] = 0;
    }
    for (let k = 0; k < count; k += 1) {
      for (let j = 0; j < count; j += 1) {
        h[k * count + j] = ports.z[k * count + j]! - (y[k]! * p[j]!) / loop;
      }
    }
  };

  /** One step of Newton's method; the largest move, counted as in the whole circuit. */
  const improve = (): number => {
    for (let k = 0; k < count; k += 1) {
      move[k] = base[k]! - now[k]!.voltage;
      for (let j = 0; j < count; j += 1) {
        const gain = h[k * count + j]!;
        move[k]! += gain * excess[j]!;
        const slope = now[j]!.conductance - junctions[j]!.conductance;
        jacobian[k * count + j] = (k === j ? 1 : 0) - gain * slope;
      }
    }
    if (!solveDense(jacobian, move)) return NaN;
    let largest = 0;
    for (let k = 0; k < count; k += 1) {
      largest = Math.max(largest, moveJunction(now[k]!, now[k]!.voltage + move[k]!));
      excess[k] = excessOf(now[k]!, junctions[k]!);
    }
    return largest;
  };

  const solve: PortNewton['solve'] = (red, black, amps, loop) => {
    prepare(red, black, amps, loop);
    for (let iteration = 0; iteration < MOST_ITERATIONS; iteration += 1) {
      const moved = count === 0 ? 0 : improve();
      if (Number.isNaN(moved)) return undefined;
      if (moved > EXACT) continue;
      let volts = 0;
      for (let j = 0; j < count; j += 1) volts += p[j]! * excess[j]!;
      return { amps: amps - volts / loop, volts };
    }
    return undefined;
  };
  return { excess, solve };
}

/** Law less straight line: what the junction carries beyond what the factored circuit gives it. */
function excessOf(now: Junction, straight: Junction): number {
  return now.current - straight.current - straight.conductance * (now.voltage - straight.voltage);
}

function moveJunction(junction: Junction, wanted: number): number {
  const next = limitJunction(junction, wanted);
  const moved = Math.abs(next - junction.voltage);
  if (Number.isNaN(moved)) return NaN;
  const before = junction.conductance;
  linearise(junction, next);
  const conductance = Math.max(before, junction.conductance);
  const share = conductance / (Math.abs(junction.current) + junction.saturation);
  return Math.max(moved * share, Math.abs(wanted - next) / junction.slope);
}

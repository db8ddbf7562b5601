import { linearise, type Junction } from '../devices/diode-law.ts';
import { limitJunction } from '../devices/junction-limit.ts';
import { solveDense } from '../linear/dense-lu.ts';
import { EXACT } from './newton.ts';

/**
 * Junctions seen through the ports of a linear circuit, and nothing else:
 *   v_k = base_k + sum_j H_kj d_j(v_j),   d_j(v) = law_j(v) - i_j - g_j (v - v_j),
 * solved by Newton's method on v with the junctions limited as in the whole circuit. The straight
 * line (i_j, g_j about v_j) of each junction is in the linear circuit already.
 */
export interface JunctionPort {
  /** V across each junction with its straight line alone */ readonly base: Float64Array;
  /** V at junction k for 1 A of excess in junction j, at k * count + j */ readonly h: Float64Array;
  /** A by which each law departs from its line; the solution is left here */
  readonly excess: Float64Array;
}

export interface JunctionNewton extends JunctionPort {
  /** Solves for the excesses; false when it does not converge. */
  solve(): boolean;
}

const MOST_ITERATIONS = 60;

/** Room for these junctions, whose present linear forms are their straight lines. */
export function createJunctionNewton(straight: readonly Junction[]): JunctionNewton {
  const count = straight.length;
  const now: Junction[] = straight.map((junction) => ({ ...junction }));
  const base = new Float64Array(count);
  const h = new Float64Array(count * count);
  const excess = new Float64Array(count);
  const jacobian = new Float64Array(count * count);
  const move = new Float64Array(count);

  /** One step of Newton's method; the largest move, counted as in the whole circuit. */
  const improve = (): number => {
    for (let k = 0; k < count; k += 1) {
      move[k] = base[k]! - now[k]!.voltage;
      for (let j = 0; j < count; j += 1) {
        const gain = h[k * count + j]!;
        move[k]! += gain * excess[j]!;
        const slope = now[j]!.conductance - straight[j]!.conductance;
        jacobian[k * count + j] = (k === j ? 1 : 0) - gain * slope;
      }
    }
    if (!solveDense(jacobian, move)) return NaN;
    let largest = 0;
    for (let k = 0; k < count; k += 1) {
      largest = Math.max(largest, moveJunction(now[k]!, now[k]!.voltage + move[k]!));
      excess[k] = excessOf(now[k]!, straight[k]!);
    }
    return largest;
  };

  const solve = (): boolean => {
    for (let k = 0; k < count; k += 1) {
      linearise(now[k]!, straight[k]!.voltage);
      excess[k] = 0;
    }
    for (let iteration = 0; iteration < MOST_ITERATIONS; iteration += 1) {
      const moved = count === 0 ? 0 : improve();
      if (Number.isNaN(moved)) return false;
      if (moved <= EXACT) return true;
    }
    return false;
  };
  return { base, h, excess, solve };
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

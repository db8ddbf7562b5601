import type { JunctionPorts } from './junction-ports.ts';
import { createJunctionNewton } from './junction-newton.ts';
import type { Machine } from './machine.ts';

/**
 * The junctions and the meter, and nothing else. With the meter's current put in,
 *   v_k = base_k + sum_j H_kj d_j(v_j),   H_kj = Z_kj - Y_k P_j / (R + Z_pp).
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

export function createPortNewton(machine: Machine, ports: JunctionPorts): PortNewton {
  const { junctions, system } = machine;
  const count = junctions.length;
  const newton = createJunctionNewton(junctions);
  const { base, h, excess } = newton;
  const y = new Float64Array(count);
  const p = new Float64Array(count);

  const prepare = (red: number, black: number, amps: number, loop: number): void => {
    for (let k = 0; k < count; k += 1) {
      y[k] = ports.read(system.step, k);
      p[k] = ports.responses[k]![red]! - ports.responses[k]![black]!;
      base[k] = ports.open[k]! + y[k]! * amps;
    }
    for (let k = 0; k < count; k += 1) {
      for (let j = 0; j < count; j += 1) {
        h[k * count + j] = ports.z[k * count + j]! - (y[k]! * p[j]!) / loop;
      }
    }
  };

  const solve: PortNewton['solve'] = (red, black, amps, loop) => {
    prepare(red, black, amps, loop);
    if (!newton.solve()) return undefined;
    let volts = 0;
    for (let j = 0; j < count; j += 1) volts += p[j]! * excess[j]!;
    return { amps: amps - volts / loop, volts };
  };
  return { excess, solve };
}

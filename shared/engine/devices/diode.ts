import type { DiodeModel } from '../circuit/circuit.ts';
import { setConductiveBranch, setResistiveBranch } from '../stamping/branch-equation.ts';
import { REFERENCE, type System } from '../stamping/system.ts';
import { DEFAULT_CURRENT, matchBreakdown } from './match-breakdown.ts';
import { linearise, type Junction, type JunctionLaw } from './diode-law.ts';
import { log } from '../elementary/logarithm.ts';

/**
 * A junction in series with RS, as one branch. With the junction linear about v0,
 *   I = i0 + g (V - RS I - v0)  =>  V = (1/g + RS) I + v0 - i0/g
 * (or solved for I where g is small). Positive from anode (`from`) to cathode (`to`).
 */
export function createJunction(
  branch: number,
  model: DiodeModel,
  thermalVoltage: number,
  law: JunctionLaw,
): Junction {
  const slope = model.emission * thermalVoltage;
  const saturation = model.saturationCurrent;
  const junction: Junction = {
    branch,
    saturation,
    slope,
    seriesResistance: model.seriesResistance,
    breakdown:
      law === 'spice'
        ? matchBreakdown(model, thermalVoltage)
        : (model.breakdownVoltage ?? Infinity),
    breakdownCurrent: law === 'spice' ? saturation : (model.breakdownCurrent ?? DEFAULT_CURRENT),
    critical: slope * log(slope / (Math.SQRT2 * saturation)),
    law,
    voltage: 0,
    current: 0,
    conductance: 0,
    line: 0,
  };
  linearise(junction, 0);
  return junction;
}

/** S; what so small a slope does in the wrong place is nothing even behind 1e12 ohm. */
const NO_SLOPE = 1e-16;

/**
 * Writes the junction's present linear form into its branch. A line whose slope is within `slack`
 * (a share) of the junction's is kept, so that the matrix need not be factored again: the iteration
 * still ends on the law, by the chord instead of the tangent.
 */
export function stampDiode(system: System, junction: Junction, slack: number = 0): void {
  const { branch, conductance, current, voltage, seriesResistance, line } = junction;
  const off = Math.abs(conductance - line);
  if (off > slack * Math.max(conductance, line) && (slack === 0 || off > NO_SLOPE)) {
    junction.line = conductance;
  }
  const slope = junction.line;
  if (slope * REFERENCE > 1) {
    setResistiveBranch(system, branch, 1 / slope + seriesResistance, voltage - current / slope);
  } else {
    const share = 1 / (1 + slope * seriesResistance);
    setConductiveBranch(system, branch, slope * share, (current - slope * voltage) * share);
  }
}

/** V across the junction itself, RS taken off, in the system's present solution. */
export function junctionVoltage(system: System, junction: Junction): number {
  const { from, to, nodeCount } = system.netlist;
  const { branch, seriesResistance } = junction;
  const { x } = system;
  const across = x[from[branch]!]! - x[to[branch]!]!;
  return across - (seriesResistance * x[nodeCount + branch]!) / REFERENCE;
}

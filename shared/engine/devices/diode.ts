import type { DiodeModel } from '../circuit/circuit.ts';
import { setConductiveBranch, setResistiveBranch } from '../stamping/branch-equation.ts';
import { REFERENCE, type System } from '../stamping/system.ts';
import { linearise, type Junction, type JunctionLaw } from './diode-law.ts';

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
    breakdown: model.breakdownVoltage ?? Infinity,
    // the usual default of IBV in a model card
    breakdownCurrent: model.breakdownCurrent ?? 1e-3,
    critical: slope * Math.log(slope / (Math.SQRT2 * saturation)),
    law,
    voltage: 0,
    current: 0,
    conductance: 0,
  };
  linearise(junction, 0);
  return junction;
}

/** Writes the junction's present linear form into its branch. */
export function stampDiode(system: System, junction: Junction): void {
  const { branch, conductance, current, voltage, seriesResistance } = junction;
  if (conductance * REFERENCE > 1) {
    setResistiveBranch(
      system,
      branch,
      1 / conductance + seriesResistance,
      voltage - current / conductance,
    );
  } else {
    const share = 1 / (1 + conductance * seriesResistance);
    setConductiveBranch(
      system,
      branch,
      conductance * share,
      (current - conductance * voltage) * share,
    );
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

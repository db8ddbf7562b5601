import type { Tableau } from '../integration/tableau.ts';
import type { Machine } from './machine.ts';

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
  /** V by which the rates of flux in the first stage may be off, for want of digits in the flux */
  rateNoise: number;
  /** the solution at the start of the step, to fall back to */ readonly startX: Float64Array;
  readonly startJunctions: Float64Array;
  /** S of each junction there */ readonly startConductances: Float64Array;
  /** A of each inductor at the start of the step */ readonly startCurrents: Float64Array;
  readonly history: Float64Array;
  /** largest size each voltage (V) and current (A) has had so far */ readonly sizes: Float64Array;
  /** called after each stage but the first, with its number, while its solution stands */
  onStage?: (stage: number) => void;
}

export function createIntegrator(machine: Machine, tableau: Tableau): Integrator {
  const count = machine.capacitors.length + machine.inductors.length;
  return {
    machine,
    tableau,
    state: new Float64Array(count),
    nextState: new Float64Array(count),
    rates: Array.from({ length: tableau.stages }, () => new Float64Array(count)),
    rateNoise: 0,
    startX: machine.system.x.slice(),
    startJunctions: new Float64Array(machine.junctions.length),
    startConductances: new Float64Array(machine.junctions.length),
    startCurrents: new Float64Array(machine.inductors.length),
    history: new Float64Array(count),
    sizes: new Float64Array(count),
  };
}

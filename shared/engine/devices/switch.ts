import type { SwitchModel } from '../circuit/circuit.ts';
import { setResistiveBranch } from '../stamping/branch-equation.ts';
import type { System } from '../stamping/system.ts';

/**
 * V = RON I or V = ROFF I. It turns on above VT + VH and off below VT - VH of its control voltage,
 * and between the two keeps the state it had. Source: ngspice manual, chapter on switches.
 */
export interface SwitchState {
  readonly branch: number;
  readonly controlFrom: number;
  readonly controlTo: number;
  readonly model: SwitchModel;
  isOn: boolean;
}

export function stampSwitch(system: System, state: SwitchState): void {
  const { onResistance, offResistance } = state.model;
  setResistiveBranch(system, state.branch, state.isOn ? onResistance : offResistance, 0);
}

/** V at the control, less the threshold that matters now: above zero means the switch must turn. */
export function switchOverdrive(system: System, state: SwitchState): number {
  const { threshold, hysteresis } = state.model;
  const control = system.x[state.controlFrom]! - system.x[state.controlTo]!;
  const band = Math.abs(hysteresis);
  return state.isOn ? threshold - band - control : control - threshold - band;
}

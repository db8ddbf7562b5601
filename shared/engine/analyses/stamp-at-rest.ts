import { stampCapacitorAtRest } from '../devices/capacitor.ts';
import { stampCouplingAtRest } from '../devices/coupling.ts';
import { stampDiode } from '../devices/diode.ts';
import type { Junction } from '../devices/diode-law.ts';
import { stampInductorAtRest } from '../devices/inductor.ts';
import { stampResistor } from '../devices/resistor.ts';
import { stampSwitch, type SwitchState } from '../devices/switch.ts';
import { stampVoltageSource } from '../devices/voltage-source.ts';
import type { System } from '../stamping/system.ts';

interface Parts {
  readonly sources: readonly { readonly branch: number }[];
  readonly resistors: readonly { readonly branch: number; readonly value: number }[];
  readonly capacitors: readonly { readonly branch: number }[];
  readonly inductors: readonly { readonly branch: number; readonly resistance: number }[];
  readonly junctions: readonly Junction[];
  readonly switches: readonly SwitchState[];
}

/** Writes every branch as it is with nothing changing: capacitors open, inductors their resistance. */
export function stampAtRest(system: System, parts: Parts): void {
  stampFixed(system, parts);
  for (const { branch } of parts.capacitors) stampCapacitorAtRest(system, branch);
  for (const { branch, resistance } of parts.inductors) {
    stampInductorAtRest(system, branch, resistance);
  }
  for (let c = 0; c < system.netlist.coupled.length; c += 1) stampCouplingAtRest(system, c);
}

/** Writes what is the same at rest and in motion: resistors, sources' rows, switches, junctions. */
export function stampFixed(
  system: System,
  parts: Pick<Parts, 'sources' | 'resistors' | 'switches' | 'junctions'>,
): void {
  for (const { branch, value } of parts.resistors) stampResistor(system, branch, value);
  for (const state of parts.switches) stampSwitch(system, state);
  for (const junction of parts.junctions) stampDiode(system, junction);
  for (const { branch } of parts.sources) {
    if (branch >= 0) stampVoltageSource(system, branch, system.rho[branch]!);
  }
}

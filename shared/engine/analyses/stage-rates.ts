import { capacitorRate, setCapacitorHistory } from '../devices/capacitor.ts';
import { inductorRate, setInductorHistory } from '../devices/inductor.ts';
import { inductorCurrent } from './inductor-current.ts';
import type { Integrator } from './integrator.ts';

/** Writes what the earlier stages give, V* and F*, as the right-hand sides of a stage of `length` s. */
export function setHistory({ machine, history }: Integrator, length: number): void {
  const { system, capacitors, inductors } = machine;
  for (let j = 0; j < capacitors.length; j += 1) {
    setCapacitorHistory(system, capacitors[j]!.branch, history[j]!);
  }
  let largest = 0;
  for (let j = 0; j < inductors.length; j += 1) {
    const flux = history[capacitors.length + j]!;
    setInductorHistory(system, inductors[j]!.branch, flux, length);
    largest = Math.max(largest, Math.abs(flux));
  }
  machine.voltageNoise = (8 * Number.EPSILON * largest) / length;
}

/** Reads dV/dt and d(flux)/dt of the stage just solved into `rate`; the history must still stand. */
export function readRates(integrator: Integrator, rate: Float64Array, length: number): void {
  const { machine, history } = integrator;
  const { system, netlist, capacitors, inductors, mutuals, windings } = machine;
  const base = capacitors.length;
  for (let j = 0; j < base; j += 1) {
    rate[j] = capacitorRate(system, capacitors[j]!.branch, capacitors[j]!.value);
  }
  for (let j = 0; j < inductors.length; j += 1) {
    rate[base + j] = inductors[j]!.value * inductorCurrent(machine, j);
  }
  for (let c = 0; c < mutuals.length; c += 1) {
    const first = windings[2 * c]!;
    const second = windings[2 * c + 1]!;
    rate[base + first]! += mutuals[c]! * inductorCurrent(machine, second);
    rate[base + second]! += mutuals[c]! * inductorCurrent(machine, first);
  }
  // d(flux)/dt two ways: by the flux where that is well known, by the voltages where the stage is
  // so short that the flux has no digits left for its change
  for (let j = 0; j < inductors.length; j += 1) {
    const { branch, resistance } = inductors[j]!;
    const flux = rate[base + j]!;
    const a = system.x[netlist.from[branch]!]!;
    const b = system.x[netlist.to[branch]!]!;
    const isFluxSure = Math.abs(flux) < length * (Math.abs(a) + Math.abs(b));
    rate[base + j] = isFluxSure
      ? (flux - history[base + j]!) / length
      : inductorRate(system, branch, resistance);
  }
}

import type { Storage } from '../circuit/circuit.ts';
import { inductorCurrent } from './inductor-current.ts';
import type { Integrator } from './integrator.ts';
import type { Machine } from './machine.ts';

/** Sets the state of every capacitor and inductor from what it held, its own start, or nothing. */
export function loadStorage({ machine, state }: Integrator, storage: Storage): void {
  const { netlist, capacitors, inductors } = machine;
  capacitors.forEach(({ branch }, j) => {
    const element = netlist.branches[branch]!;
    const own = element.kind === 'capacitor' ? element.initialVoltage : undefined;
    state[j] = storage.voltages[element.name] ?? own ?? 0;
  });
  const currents = inductors.map(({ branch }) => {
    const element = netlist.branches[branch]!;
    const own = element.kind === 'inductor' ? element.initialCurrent : undefined;
    return storage.currents[element.name] ?? own ?? 0;
  });
  setFluxes(machine, state, currents);
}

/** flux = L I + sum of M I, V s, of each inductor, after the capacitors in `state`. */
function setFluxes(machine: Machine, state: Float64Array, currents: readonly number[]): void {
  const { capacitors, inductors, mutuals, windings } = machine;
  const base = capacitors.length;
  inductors.forEach(({ value }, j) => (state[base + j] = value * currents[j]!));
  mutuals.forEach((mutual, c) => {
    const [first, second] = [windings[2 * c]!, windings[2 * c + 1]!];
    state[base + first]! += mutual * currents[second]!;
    state[base + second]! += mutual * currents[first]!;
  });
}

/** What every capacitor and inductor of this circuit holds now. */
export function readStorage({ machine, state }: Integrator): Storage {
  const { netlist, capacitors, inductors } = machine;
  const voltages: Record<string, number> = {};
  const currents: Record<string, number> = {};
  capacitors.forEach(({ branch }, j) => (voltages[netlist.branches[branch]!.name] = state[j]!));
  inductors.forEach(({ branch }, j) => {
    currents[netlist.branches[branch]!.name] = inductorCurrent(machine, j);
  });
  return { voltages, currents };
}

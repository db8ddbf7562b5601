import { advance } from '../../engine/analyses/advance.ts';
import { assemble } from '../../oven/assemble.ts';
import type { DrawnOven, OvenState } from '../../oven/oven-state.ts';
import type { Electrical } from './run-electrically.ts';
import { refsOf } from './run-electrically.ts';

/** V; below, nobody is concerned. */
const ofConcern = 30;

/**
 * V that stand on capacitors when power goes, by element name. `cutOff` s before, the high-voltage
 * side lost its supply: meanwhile its capacitor has had its bleeder alone.
 */
export function chargeLeft(
  oven: DrawnOven,
  state: OvenState,
  { storage }: Electrical,
  cutOff: number,
): Record<string, number> {
  const { voltages } = cutOff > 0 ? bled(oven, state, storage.voltages, cutOff) : storage;
  return Object.fromEntries(
    Object.entries(voltages)
      .filter(([, volts]) => Math.abs(volts) > ofConcern)
      .map(([element, volts]) => [element, Math.round(volts * 100) / 100]),
  );
}

function bled(
  oven: DrawnOven,
  state: OvenState,
  voltages: Readonly<Record<string, number>>,
  seconds: number,
): { voltages: Readonly<Record<string, number>> } {
  const isHighVoltage = (element: string): boolean =>
    refsOf(oven, 'hv-capacitor').includes(element.split(':')[0] ?? '');
  const stored = Object.fromEntries(
    Object.entries(voltages).filter(([element]) => isHighVoltage(element)),
  );
  const left = advance(assemble(oven, state, []), { voltages: stored, currents: {} }, seconds, {
    observe: [],
  });
  if (!left.ok) throw new Error(`charge left: ${left.failure.message}`);
  const after = Object.entries(left.value.storage.voltages).filter(([element]) =>
    isHighVoltage(element),
  );
  return { voltages: { ...voltages, ...Object.fromEntries(after) } };
}

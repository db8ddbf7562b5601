import type { Integrator } from './integrator.ts';
import { ABSOLUTE_AMPERES, ABSOLUTE_VOLTS } from './step-error.ts';
import { INSTANT } from './steps.ts';

/** A step in which no state moves by more than a twentieth of itself, at the rates of the start. */
export function firstStep({ machine, state, rates }: Integrator): number {
  const { capacitors, inductors } = machine;
  let length = Infinity;
  state.forEach((value, j) => {
    const inductor = inductors[j - capacitors.length];
    const least = inductor === undefined ? ABSOLUTE_VOLTS : ABSOLUTE_AMPERES * inductor.value;
    const rate = Math.abs(rates[0]![j]!);
    if (rate > 0) length = Math.min(length, (0.05 * (Math.abs(value) + 1e6 * least)) / rate);
  });
  return Math.max(10 * INSTANT, length);
}

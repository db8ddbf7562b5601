import type { Circuit, DiodeModel, Element, Wave } from '../../shared/engine/circuit/circuit.ts';
import type { Result } from '../../shared/engine/circuit/circuit.ts';

/** Short ways to write circuits down in tests. SI units. */
export const circuit = (...elements: Element[]): Circuit => ({ elements });

export const resistor = (name: string, a: string, b: string, resistance: number): Element => ({
  kind: 'resistor',
  name,
  nodes: [a, b],
  resistance,
});

export const capacitor = (
  name: string,
  a: string,
  b: string,
  capacitance: number,
  initialVoltage?: number,
): Element => ({ kind: 'capacitor', name, nodes: [a, b], capacitance, initialVoltage });

export const inductor = (
  name: string,
  a: string,
  b: string,
  inductance: number,
  seriesResistance = 0,
): Element => ({ kind: 'inductor', name, nodes: [a, b], inductance, seriesResistance });

export const coupling = (name: string, first: string, second: string, k: number): Element => ({
  kind: 'coupling',
  name,
  inductors: [first, second],
  coefficient: k,
});

export const direct = (value: number): Wave => ({ shape: 'dc', value });

export const sine = (amplitude: number, frequency: number): Wave => ({
  shape: 'sine',
  offset: 0,
  amplitude,
  frequency,
  delay: 0,
  damping: 0,
  phaseDegrees: 0,
});

export const battery = (name: string, a: string, b: string, volts: number | Wave): Element => ({
  kind: 'voltage-source',
  name,
  nodes: [a, b],
  wave: typeof volts === 'number' ? direct(volts) : volts,
});

/** A source of 0 V direct whose phasor is `magnitude` at `phaseDegrees`. */
export const phasorSource = (
  name: string,
  a: string,
  b: string,
  magnitude: number,
  phaseDegrees = 0,
): Element => ({
  kind: 'voltage-source',
  name,
  nodes: [a, b],
  wave: direct(0),
  ac: { magnitude, phaseDegrees },
});

/** Drives its current through itself from `a` to `b`, so out of `b` into the circuit. */
export const currentSource = (
  name: string,
  a: string,
  b: string,
  amperes: number | Wave,
): Element => ({
  kind: 'current-source',
  name,
  nodes: [a, b],
  wave: typeof amperes === 'number' ? direct(amperes) : amperes,
});

export const diode = (
  name: string,
  anode: string,
  cathode: string,
  model: Partial<DiodeModel> & { saturationCurrent: number },
): Element => ({
  kind: 'diode',
  name,
  nodes: [anode, cathode],
  model: { emission: 1, seriesResistance: 0, ...model },
});

/** The value of a result that must be one. */
export function solved<T>(result: Result<T>): T {
  if (!result.ok) throw new Error(`expected a solution: ${result.failure.message}`);
  return result.value;
}

/** The code of a failure that must be one. */
export function failureOf<T>(result: Result<T>): string {
  if (result.ok) throw new Error('expected a failure');
  return result.failure.code;
}

/** |value / expected - 1| */
export const relativeError = (value: number, expected: number): number =>
  Math.abs(value / expected - 1);

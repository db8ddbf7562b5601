/**
 * Insulation that holds an ohmmeter and gives way above a voltage:
 * two junctions back to back, each with reverse breakdown BV = volts.
 *   |v| < BV: I about IS = 1 pA;  |v| > BV: I = (|v| - BV) / RS
 * Common practice, no source.
 */
import type { Element, NodeName } from '../../engine/circuit/circuit.ts';

/** Breaks down above `volts` in either direction, then conducts with `resistance` Ohm. */
export function breakdown(
  name: string,
  from: NodeName,
  to: NodeName,
  volts: number,
  resistance: number,
): Element[] {
  const middle = `${name}-middle`;
  const model = {
    saturationCurrent: 1e-12,
    emission: 2,
    seriesResistance: resistance / 2,
    breakdownVoltage: volts,
    breakdownCurrent: 1e-6,
  };
  return [
    { kind: 'diode', name: `${name}-forward`, nodes: [from, middle], model },
    { kind: 'diode', name: `${name}-back`, nodes: [to, middle], model },
  ];
}

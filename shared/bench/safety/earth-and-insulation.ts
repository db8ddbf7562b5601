/**
 * From the plug, cord out: earth pin to chassis as resistance, and both mains pins together against
 * the earth pin at 500 V DC as insulation. Both from the solved circuit, so a path that only breaks
 * down at a voltage shows at 500 V and not on an ohmmeter.
 * What is usual: earth below 0.1 to 0.2 ohm, insulation above 1 or 2 megohm (from memory; local codes
 * and the maker's service information decide).
 */
import { operatingPoint } from '../../engine/analyses/operating-point.ts';
import type { Element } from '../../engine/circuit/circuit.ts';
import { assemble } from '../../oven/assemble.ts';
import type { DrawnOven, OvenState } from '../../oven/oven-state.ts';

const testVolts = 500;
/** Ohm; beyond, the tester shows that it is over its range */
const mostOhms = 2e9;
/** A, from plug to chassis */
const bondAmps = 1;

export interface PlugCheck {
  /** Ohm */ earth: number | null;
  /** Ohm, at 500 V DC; null: over the range of 2 GOhm */ insulation: number | null;
}

export function checkFromPlug(oven: DrawnOven, state: OvenState): PlugCheck {
  return { earth: earthBond(oven, state), insulation: insulation(oven, state) };
}

function earthBond(oven: DrawnOven, state: OvenState): number | null {
  const source: Element = {
    kind: 'current-source',
    name: 'tester',
    nodes: ['CH.1', 'P1.E'],
    wave: { shape: 'dc', value: bondAmps },
  };
  const volts = solve(oven, state, [source]);
  if (!volts) return null;
  const ohms = ((volts['P1.E'] ?? 0) - (volts['CH.1'] ?? 0)) / bondAmps;
  return ohms < 100 ? round(ohms, 3) : null;
}

function insulation(oven: DrawnOven, state: OvenState): number | null {
  const elements: Element[] = [
    {
      kind: 'voltage-source',
      name: 'tester',
      nodes: ['tester', 'P1.E'],
      wave: { shape: 'dc', value: testVolts },
    },
    { kind: 'resistor', name: 'tester:sense', nodes: ['tester', 'P1.L'], resistance: 1e3 },
    { kind: 'resistor', name: 'tester:bridge', nodes: ['P1.L', 'P1.N'], resistance: 1 },
  ];
  const volts = solve(oven, state, elements);
  if (!volts) return null;
  const amps = ((volts['tester'] ?? 0) - (volts['P1.L'] ?? 0)) / 1e3;
  const ohms = testVolts / amps;
  return amps > 0 && ohms < mostOhms ? round(ohms, 3) : null;
}

function solve(
  oven: DrawnOven,
  state: OvenState,
  more: readonly Element[],
): Readonly<Record<string, number>> | null {
  const { elements } = assemble(oven, state, []);
  const solved = operatingPoint({ elements: [...elements, ...more] });
  return solved.ok ? solved.value.voltages : null;
}

const round = (value: number, digits: number): number => Number(value.toPrecision(digits));

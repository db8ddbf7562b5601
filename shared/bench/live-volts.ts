import { phasor } from '../engine/analyses/phasor.ts';
import type { Element } from '../engine/circuit/circuit.ts';
import type { TargetRef } from '../oven/oven.ts';
import type { BenchState } from './bench-state.ts';
import { circuitOf, pairOf } from './pass-time.ts';
import type { Setup } from './setup.ts';
import { magnitude } from '../engine/elementary/magnitude.ts';

/** V rms between two targets while the cord is in. Neutral is earthed at the supply. */
export function liveVolts(
  setup: Setup,
  state: BenchState,
  [a, b]: readonly [TargetRef, TargetRef],
): number {
  const solved = solveLive(setup, state);
  if (!solved) return 0;
  const [at, to] = pairOf(state, a, b).map(solved);
  if (!at || !to) return 0;
  return magnitude(at[0] - to[0], at[1] - to[1]);
}

/** Phasors (V rms, re and im) of every node with mains at the plug; null when the cord is out. */
export function solveLive(
  setup: Setup,
  state: BenchState,
): ((node: string) => readonly [number, number]) | null {
  if (!state.isCordIn) return null;
  const { volts, hertz } = setup.oven.definition.supply;
  // The supply stands in for the resistor that carries stored charge between runs.
  const circuit = circuitOf(setup, { ...state, isCordIn: false });
  const supply: Element[] = [
    {
      kind: 'voltage-source',
      name: 'mains',
      nodes: ['mains', 'P1.N'],
      wave: { shape: 'dc', value: 0 },
      ac: { magnitude: volts, phaseDegrees: 0 },
    },
    { kind: 'resistor', name: 'mains-loop', nodes: ['mains', 'P1.L'], resistance: 0.2 },
    { kind: 'resistor', name: 'mains-earth', nodes: ['P1.N', 'P1.E'], resistance: 0.1 },
  ];
  const result = phasor({ elements: [...circuit.elements, ...supply] }, [hertz]);
  if (!result.ok) throw new Error(`live circuit: ${result.failure.message}`);
  return (node) => {
    const value = result.value.voltages[node]?.[0];
    return value ? [value[0], value[1]] : [0, 0];
  };
}

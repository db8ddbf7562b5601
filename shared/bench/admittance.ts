import { phasor } from '../engine/analyses/phasor.ts';
import type { Element } from '../engine/circuit/circuit.ts';
import type { TargetRef } from '../oven/oven.ts';
import type { BenchState } from './bench-state.ts';
import { circuitOf, pairOf } from './pass-time.ts';
import type { Setup } from './setup.ts';

/** Ohm in series with the stimulus, only so that it makes no loop without resistance */
const seriesOhms = 1e-3;

/**
 * Y = I / V between two targets at `hertz`, S as [re, im], with the meter itself taken off.
 * What a capacitance setting drives the tips with decides only the frequency: the circuit is linear here.
 */
export function admittance(
  setup: Setup,
  state: BenchState,
  [red, black]: readonly [TargetRef, TargetRef],
  hertz: number,
): readonly [number, number] {
  const [a, b] = pairOf(state, red, black);
  if (a === b) return [1 / seriesOhms, 0];
  const tips = { ...state, probes: { red: null, black: null } };
  const stimulus: Element[] = [
    {
      kind: 'voltage-source',
      name: 'stimulus',
      nodes: ['stimulus', b],
      wave: { shape: 'dc', value: 0 },
      ac: { magnitude: 1, phaseDegrees: 0 },
    },
    { kind: 'resistor', name: 'stimulus:series', nodes: ['stimulus', a], resistance: seriesOhms },
  ];
  const solved = phasor({ elements: [...circuitOf(setup, tips).elements, ...stimulus] }, [hertz]);
  if (!solved.ok) throw new Error(`admittance: ${solved.failure.message}`);
  return solved.value.currents['stimulus:series']?.[0] ?? [0, 0];
}

import type { BenchState } from '../../../shared/bench/bench-state.ts';
import { rest } from '../geometry/bench-furniture.ts';
import { distance, type BenchPoint } from '../geometry/bench-point.ts';
import type { BenchScene } from '../geometry/bench-scene.ts';
import type { Hand } from './tool.ts';

interface Place {
  hand: Hand;
  at: BenchPoint;
}

const free = (hand: Hand, at: BenchPoint, target: string | null): Place[] =>
  target === null ? [{ hand, at }] : [];

/** Tools that lie on the mat: where a hand can take them from. */
export const toolsAtRest = ({ probes, discharge, battery }: BenchState): Place[] => [
  ...free({ kind: 'probe', probe: 'red' }, rest.probe.red, probes.red),
  ...free({ kind: 'probe', probe: 'black' }, rest.probe.black, probes.black),
  ...free({ kind: 'discharge-clip' }, rest.discharge.clip, discharge.clip),
  ...free({ kind: 'discharge-tip' }, rest.discharge.tip, discharge.tip),
  ...free({ kind: 'battery-clip', clip: 'neg' }, rest.battery.neg, battery.neg),
  ...free({ kind: 'battery-clip', clip: 'oneK' }, rest.battery.oneK, battery.oneK),
];

/** The tool lying within reach (bench units) of a point; the nearest one. */
export function toolLyingAt(state: BenchState, at: BenchPoint, units: number): Hand | null {
  const near = toolsAtRest(state)
    .map((place) => ({ ...place, away: distance(place.at, at) }))
    .filter(({ away }) => away <= units)
    .sort((a, b) => a.away - b.away);
  return near[0]?.hand ?? null;
}

/** The tool that sits on a target: what a drag from there takes along. Probes first, they lie on top. */
export function toolOn(state: BenchState, target: string): Hand | null {
  const { probes, discharge, battery } = state;
  if (probes.red === target) return { kind: 'probe', probe: 'red' };
  if (probes.black === target) return { kind: 'probe', probe: 'black' };
  if (discharge.tip === target) return { kind: 'discharge-tip' };
  if (discharge.clip === target) return { kind: 'discharge-clip' };
  if (battery.neg === target) return { kind: 'battery-clip', clip: 'neg' };
  if (battery.oneK === target) return { kind: 'battery-clip', clip: 'oneK' };
  return null;
}

/** A lifted lead end under the point can be carried to a terminal. */
export const looseEndAt = (scene: BenchScene, target: string): Hand | null =>
  scene.terminals.some((one) => one.target === target && one.state === 'loose-end')
    ? { kind: 'lead', end: target }
    : null;

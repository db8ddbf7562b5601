import type { StoreApi } from 'zustand/vanilla';
import type { BenchStore } from '../../simulation/bench-store.ts';
import type { BenchPoint } from '../geometry/bench-point.ts';
import type { BenchScene } from '../geometry/bench-scene.ts';
import { hitTarget, hitTest } from '../geometry/hit-test.ts';
import type { Effect, Met, World } from './gesture.ts';
import { looseEndAt, toolLyingAt, toolOn } from './tool-at.ts';
import type { Hand } from './tool.ts';

/** px around a tool that lies on the mat */
const toolReach = 22;

export const refOf = (met: Met | null): string | null => {
  switch (met?.kind) {
    case undefined:
    case 'tool':
      return null;
    case 'target':
      return met.target;
    case 'lead':
    case 'part':
      return met.ref;
  }
};

type Bench = StoreApi<BenchStore>;

/** What a pointer meets: with an empty hand everything, with a full one only what it can go on. */
export function worldOf(bench: Bench, scene: BenchScene, zoom: number): World {
  const lyingAt = (point: BenchPoint): Hand | null =>
    toolLyingAt(bench.getState().state, point, toolReach / zoom);
  return {
    meet: (point) => {
      const { hand } = bench.getState();
      const lying = hand.kind === 'empty' ? lyingAt(point) : null;
      if (lying) return { kind: 'tool', hand: lying };
      if (hand.kind === 'empty') return hitTest(scene, point, zoom);
      const hit = hand.kind === 'label' ? hitTest(scene, point, zoom) : null;
      if (hit?.kind === 'lead') return { kind: 'target', target: `${hit.ref}/${hit.nearEnd}` };
      const target = hitTarget(scene, point, zoom);
      return target === null ? null : { kind: 'target', target };
    },
    toolAt: (point) => {
      const { hand, state } = bench.getState();
      if (hand.kind !== 'empty') return null;
      const target = hitTarget(scene, point, zoom);
      const seated = target === null ? null : (toolOn(state, target) ?? looseEndAt(scene, target));
      return lyingAt(point) ?? seated;
    },
  };
}

/** What a gesture does to the bench. */
export function act(bench: Bench, effect: Exclude<Effect, { kind: 'pan' }>): void {
  const store = bench.getState();
  switch (effect.kind) {
    case 'tap':
      return tap(store, effect.met);
    case 'take':
      return store.take(effect.hand);
    case 'drop':
      return store.drop(refOf(effect.met));
    case 'let-go':
      return store.putDown();
    case 'hover':
      return store.hover(refOf(effect.met));
  }
}

function tap(store: BenchStore, met: Met | null): void {
  switch (met?.kind) {
    case undefined:
      return store.select(null);
    case 'target':
      return store.tap(met.target);
    case 'lead':
    case 'part':
      return store.select({ kind: met.kind, ref: met.ref });
    case 'tool':
      return store.take(met.hand);
  }
}

import { useRef } from 'react';
import { useBenchApi } from '../../simulation/bench-context.ts';
import type { BenchScene } from '../geometry/bench-scene.ts';
import type { BenchPointerEvent } from '../layers/use-stage-events.ts';
import { act, worldOf } from '../tools/bench-world.ts';
import {
  cancelGesture,
  followGesture,
  resting,
  type Effect,
  type Gesture,
  type World,
} from '../tools/gesture.ts';
import type { BenchCamera } from './use-bench-camera.ts';

export interface BenchPointer {
  onPointer: (event: BenchPointerEvent) => void;
  /** Escape: undoes what the pointer began; false when there was nothing */ cancel: () => boolean;
  world: World;
  apply: (effects: readonly Effect[]) => void;
}

/** Pointer on the canvas: from gesture to what the bench does. `onMoved` hears every move and draws nothing in React. */
export function useBenchPointer(
  scene: BenchScene,
  { camera, pan }: BenchCamera,
  onMoved: (event: BenchPointerEvent) => void,
): BenchPointer {
  const bench = useBenchApi();
  const gesture = useRef<Gesture>(resting);
  const world = worldOf(bench, scene, camera.zoom);
  const apply = (effects: readonly Effect[]): void => {
    for (const effect of effects) {
      if (effect.kind === 'pan') pan(effect.by);
      else act(bench, effect);
    }
  };
  const go = (step: { gesture: Gesture; effects: Effect[] }): void => {
    gesture.current = step.gesture;
    apply(step.effects);
  };
  return {
    world,
    apply,
    onPointer: (event) => {
      onMoved(event);
      go(followGesture(gesture.current, event, world));
    },
    cancel: () => {
      const isBusy = gesture.current.kind !== 'resting';
      go(cancelGesture(gesture.current));
      return isBusy;
    },
  };
}

import { useMemo } from 'react';
import { hazard } from '../../../shared/bench/record.ts';
import type { OvenLayout } from '../../../shared/oven/layout.ts';
import { useBench } from '../../simulation/bench-context.ts';
import type { BenchPoint } from '../geometry/bench-point.ts';
import type { BenchScene } from '../geometry/bench-scene.ts';
import { buildScene } from '../geometry/build-scene.ts';
import { drawBench, type BenchDrawing } from '../geometry/draw-bench.ts';
import { sceneHand } from './scene-hand.ts';

/** What of the picture stays: made once for an oven. */
export function useDrawing(layout: OvenLayout): BenchDrawing {
  const definition = useBench(({ setup }) => setup.oven.definition);
  return useMemo(() => drawBench(definition, layout), [definition, layout]);
}

/** The picture of this bench now. `isRunShown`: the last run is being looked at, its lamp lit, its fan turning. */
export function useScene(
  drawing: BenchDrawing,
  handAt: BenchPoint | null,
  isRunShown: boolean,
): BenchScene {
  const definition = useBench(({ setup }) => setup.oven.definition);
  const state = useBench((store) => store.state);
  const hand = useBench((store) => store.hand);
  const hovered = useBench((store) => store.hovered);
  const focused = useBench((store) => store.focused);
  const notice = useBench((store) => store.notice);
  const hazardFlash = useMemo(() => {
    const data = notice?.kind === 'hazard' ? hazard.safeParse(notice.event.data) : null;
    return data?.success ? data.data.at : null;
  }, [notice]);
  const run = isRunShown && state.isCordIn ? (state.runs.at(-1) ?? null) : null;
  return useMemo(
    () =>
      buildScene(
        drawing,
        state.oven,
        sceneHand(definition, state, { hand, handAt, hovered, focused, hazardFlash, run }),
      ),
    [drawing, definition, state, hand, handAt, hovered, focused, hazardFlash, run],
  );
}

import { memo, useCallback } from 'react';
import type { Camera } from '../camera/camera.ts';
import type { BenchScene, ScenePart } from '../geometry/bench-scene.ts';
import { closedOvens } from '../glyphs/closed-oven/closed-ovens.ts';
import { Painted } from '../glyphs/paint/painted.tsx';
import type { Pen } from '../glyphs/paint/pen.ts';
import { BenchLayer } from './bench-layer.tsx';
import { useSameValue } from './use-same-value.ts';

/** Where a timer's knob stands: turned up while its run is watched, else at zero. */
const minuteOf = (timer: ScenePart | undefined): number | null => {
  if (timer === undefined) return null;
  return timer.isTurning ? 8 : 0;
};

/** The oven as the customer knows it: cover on, seen from the front, its door closed or open. */
export const ClosedOvenLayer = memo(function ClosedOvenLayer({
  scene,
  camera,
}: {
  scene: BenchScene;
  camera: Camera;
}) {
  const oven = useSameValue({
    at: scene.chassis.at,
    size: scene.chassis.size,
    isDoorOpen: scene.isDoorOpen,
    isLampLit: scene.parts.some(
      ({ kind, variant, isLit }) => kind === 'lamp' && variant !== 'cooktop' && isLit,
    ),
    isHoodLit: scene.parts.some(({ variant, isLit }) => variant === 'cooktop' && isLit),
    isVentTurning: scene.parts.some(
      ({ variant, isTurning }) => variant === 'vent-fan' && isTurning,
    ),
    isTurning: scene.parts.some(({ variant, isTurning }) => variant === 'turntable' && isTurning),
    display:
      scene.parts.find(({ kind, isLit }) => kind === 'control-board' && isLit)?.stamp[0] ?? null,
    atMinute: minuteOf(scene.parts.find(({ kind }) => kind === 'mechanical-timer')),
    isDisplayLit: scene.parts.some(({ kind, isLit }) => kind === 'control-board' && isLit),
  });
  const { ovenType } = scene;
  const paint = useCallback((pen: Pen) => closedOvens[ovenType](pen, oven), [oven, ovenType]);
  return (
    <BenchLayer camera={camera}>
      <Painted paint={paint} />
    </BenchLayer>
  );
});

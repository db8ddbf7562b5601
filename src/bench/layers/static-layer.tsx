import { memo, useCallback } from 'react';
import type { Camera } from '../camera/camera.ts';
import type { BenchScene } from '../geometry/bench-scene.ts';
import { paintBattery } from '../glyphs/battery/paint-battery.ts';
import { paintMat } from '../glyphs/mat/paint-mat.ts';
import { isRoundPinned } from '../glyphs/plug/plug-glyph.ts';
import { paintOutlet } from '../glyphs/outlet/paint-outlet.ts';
import { Painted } from '../glyphs/paint/painted.tsx';
import type { Pen } from '../glyphs/paint/pen.ts';
import { PartGlyph } from '../glyphs/part/part-glyph.tsx';
import { paintChassis } from '../glyphs/chassis/paint-chassis.ts';
import { BenchLayer } from './bench-layer.tsx';
import { useSameValue } from './use-same-value.ts';

/** What does not move: the mat, the battery, the outlet, the chassis and the parts. */
export const StaticLayer = memo(function StaticLayer({
  scene,
  camera,
}: {
  scene: BenchScene;
  camera: Camera;
}) {
  const parts = useSameValue(scene.parts);
  const chassis = useSameValue(scene.chassis);
  const { isCoverOn, isDoorOpen } = scene;
  const isRound = parts.some(({ kind, stamp }) => kind === 'plug' && isRoundPinned(stamp));
  const paintGround = useCallback(
    (pen: Pen) => {
      paintMat(pen);
      paintOutlet(pen, isRound);
      paintBattery(pen);
    },
    [isRound],
  );
  const paintOpenOven = useCallback(
    (pen: Pen) => paintChassis(pen, chassis, isDoorOpen),
    [chassis, isDoorOpen],
  );
  return (
    <BenchLayer camera={camera}>
      <Painted paint={paintGround} />
      {isCoverOn ? null : (
        <>
          <Painted paint={paintOpenOven} />
          {parts
            .filter(({ kind }) => kind !== 'plug')
            .map((part) => (
              <PartGlyph key={part.ref} part={part} />
            ))}
        </>
      )}
    </BenchLayer>
  );
});

import type { ReactNode } from 'react';
import { Layer } from 'react-konva/lib/ReactKonvaCore.js';
import type { Camera } from '../camera/camera.ts';

/** A layer in bench coordinates. No layer listens: events enter at the Stage, hit-testing is our geometry. */
export function BenchLayer({ camera, children }: { camera: Camera; children: ReactNode }) {
  return (
    <Layer x={camera.x} y={camera.y} scaleX={camera.zoom} scaleY={camera.zoom} listening={false}>
      {children}
    </Layer>
  );
}

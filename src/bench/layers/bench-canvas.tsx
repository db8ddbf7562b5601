import type Konva from 'konva/lib/Core.js';
import { useRef } from 'react';
import { Stage } from 'react-konva/lib/ReactKonvaCore.js';
import { palette } from '../../styles/tokens.ts';
import type { Camera } from '../camera/camera.ts';
import type { BenchScene } from '../geometry/bench-scene.ts';
import { ClosedOvenLayer } from './closed-oven-layer.tsx';
import { LeadsLayer } from './leads-layer.tsx';
import { LiveLayer } from './live-layer.tsx';
import { StaticLayer } from './static-layer.tsx';
import { TerminalsLayer } from './terminals-layer.tsx';
import { useCanvasFonts } from './use-canvas-fonts.ts';
import { useDrawnCamera } from './use-drawn-camera.ts';
import { usePixelRatio } from './use-pixel-ratio.ts';
import { useReducedMotion } from './use-reduced-motion.ts';
import { useStageEvents, type StageEvents } from './use-stage-events.ts';

export interface BenchCanvasProps extends StageEvents {
  scene: BenchScene;
  camera: Camera;
  /** CSS px */ width: number;
  /** CSS px */ height: number;
}

/**
 * The bench as a picture. Props only: it keeps no state of the bench and asks nobody. Events enter at
 * the Stage and leave as bench points; what they hit is the caller's geometry. The parallel DOM is the
 * interface, so the canvas itself is hidden from assistive technology.
 */
export function BenchCanvas({ scene, camera, width, height, ...events }: BenchCanvasProps) {
  const stage = useRef<Konva.Stage>(null);
  usePixelRatio(stage);
  useCanvasFonts(stage);
  const reducesMotion = useReducedMotion();
  const drawn = useDrawnCamera(stage, camera, width, height);
  const handlers = useStageEvents(stage, camera, events);
  return (
    <div
      aria-hidden="true"
      style={{ touchAction: 'none', overflow: 'hidden', background: palette.mat, width, height }}
    >
      <Stage ref={stage} width={width} height={height} {...handlers}>
        <StaticLayer scene={scene} camera={drawn} />
        {scene.isCoverOn ? <ClosedOvenLayer scene={scene} camera={drawn} /> : null}
        <LeadsLayer scene={scene} camera={drawn} reducesMotion={reducesMotion} />
        <TerminalsLayer scene={scene} camera={drawn} />
        <LiveLayer
          scene={scene}
          camera={drawn}
          viewBottom={(height - drawn.y) / drawn.zoom}
          reducesMotion={reducesMotion}
        />
      </Stage>
    </div>
  );
}

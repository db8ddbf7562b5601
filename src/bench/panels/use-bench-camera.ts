import { useState } from 'react';
import {
  fitCamera,
  keepInView,
  panBy,
  pinchCamera,
  toScreen,
  wheelFactor,
  zoomAbout,
  type Camera,
  type View,
} from '../camera/camera.ts';
import type { PinchMove } from '../camera/pinch-gesture.ts';
import { benchSize } from '../geometry/bench-furniture.ts';
import type { BenchPoint } from '../geometry/bench-point.ts';

/** Below the first terminals are too close together for a finger; above the second too little of the bench is seen. */
const openZoom = { least: 0.6, most: 0.8 } as const;

export interface BenchCamera {
  camera: Camera;
  pan: (by: BenchPoint) => void;
  pinch: (move: PinchMove) => void;
  wheel: (event: { screen: BenchPoint; deltaY: number; isPinch: boolean }) => void;
  /** about the middle of the view */ zoom: (factor: number) => void;
  fit: () => void;
  /** Moves a bench point into view if it lies outside or near the edge. */ reveal: (
    at: BenchPoint,
  ) => void;
}

/** Where the bench lies in its view: fitted until the trainee moves it. */
export function useBenchCamera(view: View, isOpen: boolean): BenchCamera {
  const [moved, setMoved] = useState<Camera | null>(null);
  const camera = moved === null ? homeCamera(view, isOpen) : keepInView(moved, view, benchSize);
  const change = (next: Camera): void => setMoved(keepInView(next, view, benchSize));
  return {
    camera,
    pan: (by) => change(panBy(camera, by)),
    pinch: ({ before, after }) => change(pinchCamera(camera, before, after)),
    wheel: ({ screen, deltaY, isPinch }) =>
      change(zoomAbout(camera, screen, wheelFactor(deltaY, isPinch))),
    zoom: (factor) => change(zoomAbout(camera, [view.width / 2, view.height / 2], factor)),
    fit: () => setMoved(null),
    reveal: (at) => {
      const by = shiftIntoView(toScreen(camera, at), view);
      if (by[0] !== 0 || by[1] !== 0) change(panBy(camera, by));
    },
  };
}

/** The whole bench; with the cover off never smaller than a finger can use: then as high as the view. */
export function homeCamera(view: View, isOpen: boolean): Camera {
  const whole = fitCamera(view, benchSize);
  if (!isOpen || whole.zoom >= openZoom.least || view.width === 0) return whole;
  const high = Math.min(openZoom.most, Math.max(openZoom.least, view.height / benchSize[1]));
  const middle: BenchPoint = [view.width / 2, view.height / 2];
  return keepInView(zoomAbout(whole, middle, high / whole.zoom), view, benchSize);
}

const margin = 40;

const shiftIntoView = ([x, y]: BenchPoint, { width, height }: View): BenchPoint => {
  const shift = (at: number, span: number): number =>
    at < margin ? margin - at : at > span - margin ? span - margin - at : 0;
  return [shift(x, width), shift(y, height)];
};

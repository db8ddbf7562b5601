import type { BenchPoint } from '../geometry/bench-point.ts';

/** How the bench lies on the screen: screen = bench x zoom + offset, in CSS px. */
export interface Camera {
  zoom: number;
  x: number;
  y: number;
}

/** A view of the bench in CSS px. */
export interface View {
  width: number;
  height: number;
}

export const zoomLimits = { min: 0.3, max: 4 } as const;

/** Where a bench point is on the screen, CSS px from the canvas's upper left corner. */
export const toScreen = (camera: Camera, [x, y]: BenchPoint): BenchPoint => [
  x * camera.zoom + camera.x,
  y * camera.zoom + camera.y,
];

/** The bench point under a screen point. */
export const toBench = (camera: Camera, [x, y]: BenchPoint): BenchPoint => [
  (x - camera.x) / camera.zoom,
  (y - camera.y) / camera.zoom,
];

/** The camera that shows a whole area, in the middle, as large as it goes; zoom 1 for an empty view. */
export const fitCamera = (view: View, area: BenchPoint, at: BenchPoint = [0, 0]): Camera => {
  const wanted = Math.min(view.width / area[0], view.height / area[1]);
  const zoom = wanted > 0 ? clampZoom(wanted) : 1;
  return {
    zoom,
    x: (view.width - area[0] * zoom) / 2 - at[0] * zoom,
    y: (view.height - area[1] * zoom) / 2 - at[1] * zoom,
  };
};

const clampZoom = (zoom: number): number =>
  Math.min(zoomLimits.max, Math.max(zoomLimits.min, zoom));

/** Zooms by a factor, keeping the bench point under `about` (screen px) where it is. */
export const zoomAbout = (camera: Camera, about: BenchPoint, factor: number): Camera => {
  const zoom = clampZoom(camera.zoom * factor);
  const held = toBench(camera, about);
  return { zoom, x: about[0] - held[0] * zoom, y: about[1] - held[1] * zoom };
};

/** Moves the bench by screen px. */
export const panBy = (camera: Camera, [dx, dy]: BenchPoint): Camera => ({
  ...camera,
  x: camera.x + dx,
  y: camera.y + dy,
});

/** Keeps at least a third of the view filled with bench, so that it can never be lost off the screen. */
export const keepInView = (camera: Camera, view: View, area: BenchPoint): Camera => {
  const hold = (offset: number, length: number, span: number): number => {
    const least = Math.min(span, length) / 3;
    return Math.min(span - least, Math.max(least - length, offset));
  };
  return {
    zoom: camera.zoom,
    x: hold(camera.x, area[0] * camera.zoom, view.width),
    y: hold(camera.y, area[1] * camera.zoom, view.height),
  };
};

/** The zoom factor of one wheel step. Pinching on a trackpad arrives as a wheel with small steps and the control key. */
export const wheelFactor = (deltaY: number, isPinch: boolean): number =>
  Math.exp(-Math.min(120, Math.max(-120, deltaY)) * (isPinch ? 0.012 : 0.0022));

/** The camera after two fingers moved from one pair of screen points to another: zoom by their spread, pan by their middle. */
export const pinchCamera = (
  camera: Camera,
  before: readonly [BenchPoint, BenchPoint],
  after: readonly [BenchPoint, BenchPoint],
): Camera => {
  const middle = ([a, b]: readonly [BenchPoint, BenchPoint]): BenchPoint => [
    (a[0] + b[0]) / 2,
    (a[1] + b[1]) / 2,
  ];
  const spread = ([a, b]: readonly [BenchPoint, BenchPoint]): number =>
    Math.hypot(a[0] - b[0], a[1] - b[1]);
  const from = middle(before);
  const to = middle(after);
  const factor = spread(before) > 1 ? spread(after) / spread(before) : 1;
  return zoomAbout(panBy(camera, [to[0] - from[0], to[1] - from[1]]), to, factor);
};

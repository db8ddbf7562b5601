import type { BenchPoint } from './bench-point.ts';

/** A rectangle along the axes, bench units; `at` is its upper left corner. */
export interface BenchBox {
  at: BenchPoint;
  size: BenchPoint;
}

/** The box of a given size around its centre. */
export const boxAround = (centre: BenchPoint, size: BenchPoint): BenchBox => ({
  at: [centre[0] - size[0] / 2, centre[1] - size[1] / 2],
  size,
});

/** The middle of a box. */
export const boxCentre = (box: BenchBox): BenchPoint => [
  box.at[0] + box.size[0] / 2,
  box.at[1] + box.size[1] / 2,
];

/** Whether two boxes share more than an edge, each grown by `margin` units. */
export const boxesOverlap = (a: BenchBox, b: BenchBox, margin = 0): boolean =>
  a.at[0] < b.at[0] + b.size[0] + margin &&
  b.at[0] < a.at[0] + a.size[0] + margin &&
  a.at[1] < b.at[1] + b.size[1] + margin &&
  b.at[1] < a.at[1] + a.size[1] + margin;

/** Distance of a point from a box, 0 inside, bench units. */
export const distanceToBox = (point: BenchPoint, box: BenchBox): number =>
  Math.hypot(
    Math.max(box.at[0] - point[0], 0, point[0] - box.at[0] - box.size[0]),
    Math.max(box.at[1] - point[1], 0, point[1] - box.at[1] - box.size[1]),
  );

/** Whether a point lies in a box. */
export const isInBox = (point: BenchPoint, box: BenchBox): boolean =>
  distanceToBox(point, box) === 0;

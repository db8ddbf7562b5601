/** A point on the bench seen from above, in bench units: x to the right, y towards the trainee. */
export type BenchPoint = readonly [number, number];

/** Distance between two points, bench units. */
export const distance = (a: BenchPoint, b: BenchPoint): number =>
  Math.hypot(a[0] - b[0], a[1] - b[1]);

/** The point a share `t` (0 to 1) of the way from `a` to `b`. */
export const between = (a: BenchPoint, b: BenchPoint, t: number): BenchPoint => [
  a[0] + (b[0] - a[0]) * t,
  a[1] + (b[1] - a[1]) * t,
];

/** The point `length` units from `from` in direction `angle` (radians, clockwise from the right as y falls towards the trainee). */
export const along = (from: BenchPoint, angle: number, length: number): BenchPoint => [
  from[0] + Math.cos(angle) * length,
  from[1] + Math.sin(angle) * length,
];

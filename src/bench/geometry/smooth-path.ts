import { distance, type BenchPoint } from './bench-point.ts';

/** One cubic Bezier piece: start, two controls, end. */
export type CurvePiece = readonly [BenchPoint, BenchPoint, BenchPoint, BenchPoint];

/**
 * A smooth curve through every point: centripetal Catmull-Rom pieces written as cubic Beziers.
 * Centripetal because it neither loops nor overshoots between points at unequal distances
 * (Yuksel, Schaefer and Keyser, "Parameterization and applications of Catmull-Rom curves", 2011).
 * The curve starts exactly on the first point and ends exactly on the last. Fewer than two points: no pieces.
 */
export const smoothPath = (given: readonly BenchPoint[]): CurvePiece[] => {
  const points = given.filter((point, i) => i === 0 || distance(point, given[i - 1]!) > 0.01);
  const pieces: CurvePiece[] = [];
  for (let i = 0; i + 1 < points.length; i++) {
    const p1 = points[i]!;
    const p2 = points[i + 1]!;
    const p0 = points[i - 1] ?? mirror(p1, p2);
    const p3 = points[i + 2] ?? mirror(p2, p1);
    pieces.push([p1, control(p0, p1, p2), control(p3, p2, p1), p2]);
  }
  return pieces;
};

const mirror = (end: BenchPoint, inner: BenchPoint): BenchPoint => [
  2 * end[0] - inner[0],
  2 * end[1] - inner[1],
];

/** The Bezier control beside `here`, on the way to `next`, with `before` on the other side. */
const control = (before: BenchPoint, here: BenchPoint, next: BenchPoint): BenchPoint => {
  const a = Math.sqrt(distance(before, here));
  const b = Math.sqrt(distance(here, next));
  const at = (k: 0 | 1): number =>
    (a * a * next[k] - b * b * before[k] + (2 * a * a + 3 * a * b + b * b) * here[k]) /
    (3 * a * (a + b));
  return [at(0), at(1)];
};

const onPiece = ([p0, p1, p2, p3]: CurvePiece, t: number): BenchPoint => {
  const u = 1 - t;
  const at = (k: 0 | 1): number =>
    u * u * u * p0[k] + 3 * u * u * t * p1[k] + 3 * u * t * t * p2[k] + t * t * t * p3[k];
  return [at(0), at(1)];
};

/** The curve as a chain of short straight pieces, for measuring; `steps` per Bezier piece. */
export const flatten = (pieces: readonly CurvePiece[], steps = 12): BenchPoint[] => {
  const first = pieces[0];
  if (first === undefined) return [];
  const points: BenchPoint[] = [first[0]];
  for (const piece of pieces)
    for (let i = 1; i <= steps; i++) points.push(onPiece(piece, i / steps));
  return points;
};

/** Distance of a point from a chain of straight pieces, bench units; Infinity for an empty chain. */
export const distanceToChain = (point: BenchPoint, chain: readonly BenchPoint[]): number => {
  let nearest = Infinity;
  for (let i = 0; i + 1 < chain.length; i++)
    nearest = Math.min(nearest, distanceToPiece(point, chain[i]!, chain[i + 1]!));
  return nearest;
};

/** How far a lead's curve may swing out of the box of its points, units: generous, for a first coarse look. */
const overshoot = 60;

/**
 * Distance of a point from the smooth curve through points, if it is at most `reach`, else Infinity.
 * A Bezier piece lies within the box of its four points, so far pieces are never drawn out.
 */
export const distanceToCurve = (
  point: BenchPoint,
  points: readonly BenchPoint[],
  reach: number,
): number => {
  let nearest = Infinity;
  if (!isNearBox(point, points, reach + overshoot)) return nearest;
  for (const piece of smoothPath(points))
    if (isNearBox(point, piece, reach))
      nearest = Math.min(nearest, distanceToChain(point, flatten([piece])));
  return nearest <= reach ? nearest : Infinity;
};

const isNearBox = (at: BenchPoint, points: readonly BenchPoint[], reach: number): boolean =>
  ([0, 1] as const).every((k) => {
    let least = Infinity;
    let most = -Infinity;
    for (const point of points) {
      least = Math.min(least, point[k]);
      most = Math.max(most, point[k]);
    }
    return at[k] >= least - reach && at[k] <= most + reach;
  });

const distanceToPiece = (p: BenchPoint, a: BenchPoint, b: BenchPoint): number => {
  const dx = b[0] - a[0];
  const dy = b[1] - a[1];
  const length2 = dx * dx + dy * dy;
  const t =
    length2 === 0
      ? 0
      : Math.min(1, Math.max(0, ((p[0] - a[0]) * dx + (p[1] - a[1]) * dy) / length2));
  return Math.hypot(p[0] - a[0] - t * dx, p[1] - a[1] - t * dy);
};

/** Length of a chain, bench units. */
export const chainLength = (chain: readonly BenchPoint[]): number =>
  chain.reduce((sum, point, i) => sum + (i === 0 ? 0 : distance(chain[i - 1]!, point)), 0);

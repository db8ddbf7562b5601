import { distance, type BenchPoint } from './bench-point.ts';

/**
 * The points a lead runs through from end a to end b. An end that is not at home (lifted, or fitted
 * elsewhere) keeps the way along the loom only up to the point nearest to where it is now: a lead
 * leaves its loom there and reaches over, it does not go all the way home and come back.
 */
export const leadPath = (
  a: BenchPoint,
  via: readonly BenchPoint[],
  b: BenchPoint,
  isHome: readonly [boolean, boolean],
): BenchPoint[] => {
  const fromA = isHome[0] ? via : shortened(a, via);
  const both = isHome[1] ? fromA : [...shortened(b, [...fromA].reverse())].reverse();
  return [a, ...both, b];
};

/** The way after its point nearest to `end`, that point included unless it crowds the connector. */
const shortened = (end: BenchPoint, way: readonly BenchPoint[]): readonly BenchPoint[] => {
  if (way.length === 0) return way;
  let nearest = 0;
  way.forEach((point, i) => {
    if (distance(point, end) < distance(way[nearest]!, end)) nearest = i;
  });
  const crowds = distance(way[nearest]!, end) < 22;
  return way.slice(crowds ? nearest + 1 : nearest);
};

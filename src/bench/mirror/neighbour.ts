import type { BenchPoint } from '../geometry/bench-point.ts';

export type Direction = 'left' | 'right' | 'up' | 'down';

const toward: Readonly<Record<Direction, BenchPoint>> = {
  left: [-1, 0],
  right: [1, 0],
  up: [0, -1],
  down: [0, 1],
};

/**
 * The nearest place in a direction, as seen on the bench: what lies straight ahead counts before what
 * lies aside. Null: nothing lies that way.
 */
export function neighbour<P extends { at: BenchPoint }>(
  from: P,
  places: readonly P[],
  direction: Direction,
): P | null {
  const [ux, uy] = toward[direction];
  let best: P | null = null;
  let least = Infinity;
  for (const place of places) {
    const [dx, dy] = [place.at[0] - from.at[0], place.at[1] - from.at[1]];
    const ahead = dx * ux + dy * uy;
    const aside = Math.abs(dx * uy) + Math.abs(dy * ux);
    if (place === from || ahead < 1 || aside > 2.5 * ahead) continue;
    const cost = ahead + 2 * aside;
    if (cost < least) [best, least] = [place, cost];
  }
  return best;
}

import type { Stroke } from './symbol.ts';

/** Bolted to the chassis: a bar with three slanted strokes under the point. */
export const chassisMark = ([x, y]: readonly [number, number]): Stroke => ({
  d: `M${x - 7} ${y}H${x + 7}M${x - 5} ${y}l-4 6M${x + 1} ${y}l-4 6M${x + 7} ${y}l-4 6`,
  kind: 'fine',
});

import { isInBox, type BenchBox } from './bench-box.ts';
import type { BenchPoint } from './bench-point.ts';
import type { ScenePart } from './bench-scene.ts';

/** The cord's way: from the plug's lower edge along the middle of the ways of its leads to just inside the chassis. */
export const cordPath = (
  plug: Pick<ScenePart, 'at' | 'size'> | undefined,
  ways: readonly (readonly BenchPoint[])[],
  chassis: BenchBox,
): BenchPoint[] => {
  const first = ways[0];
  if (plug === undefined || first === undefined) return [];
  const middle = first.map((_, i): BenchPoint => {
    const there = ways.flatMap((way) => (way[i] === undefined ? [] : [way[i]]));
    return [mean(there.map(([x]) => x)), mean(there.map(([, y]) => y))];
  });
  const entry = middle.findIndex((point) => isInBox(point, chassis));
  const outside = entry < 0 ? middle : middle.slice(0, entry + 1);
  return [[plug.at[0] + plug.size[0] / 2, plug.at[1] + plug.size[1] - 6], ...outside];
};

const mean = (values: readonly number[]): number =>
  values.reduce((sum, value) => sum + value, 0) / Math.max(1, values.length);

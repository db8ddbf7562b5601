import type { BenchBox } from './bench-box.ts';
import { between, distance, type BenchPoint } from './bench-point.ts';

const cell = 20;
/** Half a lead's width: a box this near to its middle lies on it. */
const margin = 3;

/** Short pieces of lead, by their middle, sorted into cells of 20 units so that a box asks only those around it. */
export type LeadMap = ReadonlyMap<string, readonly { middle: BenchPoint; length: number }[]>;

const keyOf = (column: number, row: number): string => `${column},${row}`;

/** Sorts the pieces of all chains into cells. */
export const mapLeads = (chains: readonly (readonly BenchPoint[])[]): LeadMap => {
  const map = new Map<string, { middle: BenchPoint; length: number }[]>();
  for (const chain of chains)
    for (let i = 0; i + 1 < chain.length; i++) {
      const middle = between(chain[i]!, chain[i + 1]!, 0.5);
      const key = keyOf(Math.floor(middle[0] / cell), Math.floor(middle[1] / cell));
      const there = map.get(key) ?? [];
      there.push({ middle, length: distance(chain[i]!, chain[i + 1]!) });
      map.set(key, there);
    }
  return map;
};

/** Units of lead that run under a box. */
export const coveredLength = (
  { at: [x, y], size: [width, height] }: BenchBox,
  map: LeadMap,
): number => {
  const [left, right] = [x - margin, x + width + margin];
  const [top, bottom] = [y - margin, y + height + margin];
  let units = 0;
  for (let column = Math.floor(left / cell); column <= Math.floor(right / cell); column++)
    for (let row = Math.floor(top / cell); row <= Math.floor(bottom / cell); row++)
      for (const { middle, length } of map.get(keyOf(column, row)) ?? [])
        if (middle[0] > left && middle[0] < right && middle[1] > top && middle[1] < bottom)
          units += length;
  return units;
};

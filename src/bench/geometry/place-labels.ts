import { boxAround, boxesOverlap, distanceToBox, type BenchBox } from './bench-box.ts';
import type { BenchPoint } from './bench-point.ts';
import { coveredLength, type LeadMap } from './lead-map.ts';

/** A text to be placed: its sizes to choose from, best first, and the middles it may take, best first. */
export interface LabelWish {
  id: string;
  choices: readonly { text: string; size: BenchPoint; at: BenchPoint; cost: number }[];
}

export interface PlacedLabel {
  text: string;
  at: BenchPoint;
  box: BenchBox;
}

export interface LabelObstacles {
  /** never covered: middles of terminals, kept free by `clearance` units */
  points: readonly BenchPoint[];
  clearance: number;
  /** never covered */ boxes: readonly BenchBox[];
  /** better not covered */ leads: LeadMap;
  /** everything stays inside */ within: BenchBox;
}

const gap = 1.5;
const coverCost = 1.2;

/**
 * Places labels so that none covers a terminal or another label. Labels with the fewest free places
 * choose first; of its free places each takes the one that costs least, where each unit of lead it
 * would lie under costs too. A label without a free place is left out: the caller's test says so.
 */
export const placeLabels = (
  wishes: readonly LabelWish[],
  obstacles: LabelObstacles,
): Map<string, PlacedLabel> => {
  const open = wishes.map((wish) => ({
    id: wish.id,
    free: wish.choices
      .map((choice) => ({ ...choice, box: boxAround(choice.at, choice.size) }))
      .filter(({ box }) => isFree(box, obstacles))
      .map((choice) => ({
        ...choice,
        cost: choice.cost + coverCost * coveredLength(choice.box, obstacles.leads),
      }))
      .sort((a, b) => a.cost - b.cost),
  }));
  const placed = new Map<string, PlacedLabel>();
  while (open.length > 0) {
    open.sort((a, b) => a.free.length - b.free.length || (a.id < b.id ? -1 : 1));
    const next = open.shift()!;
    const best = next.free[0];
    if (best === undefined) continue;
    placed.set(next.id, { text: best.text, at: best.at, box: best.box });
    for (const other of open)
      other.free = other.free.filter(({ box }) => !boxesOverlap(box, best.box, gap));
  }
  return placed;
};

const isFree = (box: BenchBox, { points, clearance, boxes, within }: LabelObstacles): boolean =>
  box.at[0] >= within.at[0] &&
  box.at[1] >= within.at[1] &&
  box.at[0] + box.size[0] <= within.at[0] + within.size[0] &&
  box.at[1] + box.size[1] <= within.at[1] + within.size[1] &&
  points.every((point) => distanceToBox(point, box) >= clearance) &&
  boxes.every((other) => !boxesOverlap(box, other, gap));

import { steps, type Grid } from './grid.ts';
import { Heap } from './heap.ts';
import { meet, type Traffic, type Trip } from './traffic.ts';

/** What a way costs beside 1 for each step. Judgement, by how the sheets come out. */
const costs = {
  bend: 3,
  crossing: 4,
  /** a step together with a lead of the same terminal: it cannot be told apart there */ together: 6,
  /** a step right beside a lead that runs the same way */ along: 0.35,
  /** past a terminal of others, where its name stands */ beside: 2.5,
} as const;

/**
 * The cheapest way from terminal to terminal on the grid (A*, Hart, Nilsson and Raphael 1968): never
 * over a symbol, a terminal of others, or along a lead of other terminals; such a lead is crossed only
 * where both run straight. Null: there is none.
 */
export function findWay(grid: Grid, traffic: Traffic, trip: Trip): number[] | null {
  const { columns } = grid;
  const offsets = steps.map(([dx, dy]) => dx + dy * columns);
  const count = grid.blocked.length * 4;
  const cost = new Float64Array(count).fill(Infinity);
  const cameFrom = new Int32Array(count).fill(-1);
  const [toX, toY] = [trip.to % columns, Math.floor(trip.to / columns)];
  const left = (node: number, heading: number): number => {
    const [dx, dy] = [toX - (node % columns), toY - Math.floor(node / columns)];
    const [ux, uy] = steps[heading]!;
    const isStraightAhead = dx * uy === dy * ux && dx * ux + dy * uy >= 0;
    return Math.abs(dx) + Math.abs(dy) + (isStraightAhead ? 0 : costs.bend);
  };
  const open = new Heap();
  const reach = (node: number, heading: number, total: number, from: number): void => {
    const state = node * 4 + heading;
    if (total >= cost[state]!) return;
    cost[state] = total;
    cameFrom[state] = from;
    open.push(state, total + left(node, heading));
  };
  for (let heading = 0; heading < 4; heading += 1) {
    const step = stepCost(grid, traffic, trip, trip.from, trip.from + offsets[heading]!, heading);
    if (step !== null) reach(trip.from + offsets[heading]!, heading, step, -1);
  }
  const done = new Uint8Array(count);
  for (let state = open.pop(); state !== null; state = open.pop()) {
    if (done[state] === 1) continue;
    done[state] = 1;
    const node = state >> 2;
    if (node === trip.to) return traceBack(state, cameFrom, trip.from);
    const heading = state & 3;
    const isStraightOnly = traffic.at(node).some((use) => !meet(use.trip, trip));
    for (let next = 0; next < 4; next += 1) {
      if (next === (heading ^ 2) || (isStraightOnly && next !== heading)) continue;
      const to = node + offsets[next]!;
      const step = stepCost(grid, traffic, trip, node, to, next);
      if (step === null) continue;
      const bend = next === heading ? 0 : costs.bend;
      reach(to, next, cost[state]! + step + bend, state);
    }
  }
  return null;
}

function stepCost(
  grid: Grid,
  traffic: Traffic,
  trip: Trip,
  from: number,
  to: number,
  heading: number,
): number | null {
  const isThere = to === trip.to;
  if (grid.blocked[to] === 1 || (grid.isTerminal[to] === 1 && !isThere)) return null;
  const beside = traffic.on(from, to);
  if (beside.some((other) => !meet(other, trip))) return null;
  const across = heading % 2 === 0 ? 1 : 0;
  const crossed = isThere ? [] : traffic.at(to);
  if (crossed.some((use) => !meet(use.trip, trip) && use.axis !== across)) return null;
  const side = across === 1 ? grid.columns : 1;
  const runsAlong = [to - side, to + side].some((node) =>
    traffic.at(node).some(({ axis }) => axis === 1 - across),
  );
  const isNew = beside.length === 0;
  return (
    1 +
    (isNew ? 0 : costs.together) +
    (isNew ? costs.crossing * crossed.length : 0) +
    (runsAlong ? costs.along : 0) +
    (grid.isBeside[to] === 1 && !isThere && from !== trip.from ? costs.beside : 0)
  );
}

function traceBack(end: number, cameFrom: Int32Array, start: number): number[] {
  const way: number[] = [];
  for (let state = end; state !== -1; state = cameFrom[state]!) way.push(state >> 2);
  return [start, ...way.reverse()];
}

import type { BenchPoint } from '../../geometry/bench-point.ts';
import { findWay } from './find-way.ts';
import type { Grid } from './grid.ts';
import { Traffic, type Trip } from './traffic.ts';

/** A lead between the places of two terminals. */
export interface LeadTrip {
  ref: string;
  from: BenchPoint;
  to: BenchPoint;
}

/** By lead: every grid point it passes, from end a to end b; a lead that finds no way is left out. */
export type Routes = ReadonlyMap<string, readonly BenchPoint[]>;

/** Each lead is taken up again this often, when all others lie. */
const rounds = 2;

/** What could lie straight comes first, then what is short. */
const rank = ({ from, to }: LeadTrip): number => {
  const [across, down] = [Math.abs(from[0] - to[0]), Math.abs(from[1] - to[1])];
  return across + down + (across > 0 && down > 0 ? 1000 : 0);
};

/**
 * Lays leads along the grid, straight and short ones first, then each once more with the others in place. `laid`
 * stays where it is. The same leads give the same routes on every machine.
 */
export function routeLeads(
  grid: Grid,
  leads: readonly LeadTrip[],
  laid: Routes = new Map(),
): Routes {
  const traffic = new Traffic();
  for (const [ref, points] of laid) {
    const way = points.map(grid.nodeOf);
    traffic.add({ ref, from: way[0] ?? 0, to: way.at(-1) ?? 0 }, way);
  }
  const ways = new Map<string, number[]>();
  const trips = [...leads]
    .sort((a, b) => rank(a) - rank(b) || (a.ref < b.ref ? -1 : 1))
    .map(({ ref, from, to }): Trip => ({ ref, from: grid.nodeOf(from), to: grid.nodeOf(to) }));
  for (let round = 0; round <= rounds; round += 1)
    for (const trip of trips) {
      const old = ways.get(trip.ref);
      if (old) traffic.remove(trip, old);
      const way = findWay(grid, traffic, trip) ?? old;
      if (!way) continue;
      traffic.add(trip, way);
      ways.set(trip.ref, way);
    }
  return new Map([...ways].map(([ref, way]) => [ref, way.map(grid.pointOf)]));
}

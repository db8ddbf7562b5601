import type { OvenDefinition, OvenLead } from '../../../shared/oven/oven.ts';
import type { OvenState } from '../../../shared/oven/oven-state.ts';
import type { BenchPoint } from '../geometry/bench-point.ts';
import type { Diagram } from './build-diagram.ts';
import { routeLeads, type Routes } from './routing/route-leads.ts';

/** One lead as it lies now. */
export interface DiagramLead {
  lead: OvenLead;
  /** grid points, without what a lifted end leaves open */ way: readonly BenchPoint[];
  /** by end: where its open end is drawn; null: it is connected */ open: readonly [
    BenchPoint | null,
    BenchPoint | null,
  ];
}

/** Leads at home keep their way; those fitted elsewhere get one of their own; lifted ends are drawn lifted. */
export function diagramLeads(
  diagram: Diagram,
  definition: OvenDefinition,
  oven: Pick<OvenState, 'leadEnds'>,
): DiagramLead[] {
  const seats = definition.leads.map((lead) => seatsOf(lead, oven));
  const moved = seats.filter(({ lead, seats: [a, b] }) => a !== lead.ends[0] || b !== lead.ends[1]);
  const routes = moved.length === 0 ? diagram.routes : withMoved(diagram, moved);
  const edges = edgesOf(definition, routes);
  return definition.leads.flatMap((lead) => {
    const way = routes.get(lead.ref);
    if (!way) return [];
    const lifted = liftedOf(lead, oven);
    const [a, b] = [
      lifted[0] ? openAfter(way, edges) : 0,
      lifted[1] ? openAfter([...way].reverse(), edges) : 0,
    ];
    const seen = trim(way, a, b);
    return [
      {
        lead,
        way: seen,
        open: [lifted[0] ? (seen[0] ?? null) : null, lifted[1] ? (seen.at(-1) ?? null) : null],
      },
    ];
  });
}

const liftedOf = ({ ref }: OvenLead, { leadEnds }: Pick<OvenState, 'leadEnds'>) =>
  [leadEnds[`${ref}/a`] === null, leadEnds[`${ref}/b`] === null] as const;

/** Where each end sits, or where it would if it were not lifted. */
function seatsOf(lead: OvenLead, { leadEnds }: Pick<OvenState, 'leadEnds'>) {
  const seats = [
    leadEnds[`${lead.ref}/a`] ?? lead.ends[0],
    leadEnds[`${lead.ref}/b`] ?? lead.ends[1],
  ] as const;
  return { lead, seats };
}

function withMoved(diagram: Diagram, moved: readonly ReturnType<typeof seatsOf>[]): Routes {
  const gone = new Set(moved.map(({ lead }) => lead.ref));
  const laid = new Map([...diagram.routes].filter(([ref]) => !gone.has(ref)));
  const trips = moved.flatMap(({ lead: { ref }, seats: [a, b] }) => {
    const [from, to] = [diagram.places[a], diagram.places[b]];
    return from && to && a !== b ? [{ ref, from, to }] : [];
  });
  const found = routeLeads(diagram.grid, trips, laid);
  // Where no way is left on the grid, a straight line still says what it connects.
  const straight = trips
    .filter(({ ref }) => !found.has(ref))
    .map(({ ref, from, to }) => [ref, [from, to]] as const);
  return new Map<string, readonly BenchPoint[]>([...laid, ...found, ...straight]);
}

const edgeKey = (a: BenchPoint, b: BenchPoint): string =>
  a[0] < b[0] || (a[0] === b[0] && a[1] < b[1])
    ? `${a.join()} ${b.join()}`
    : `${b.join()} ${a.join()}`;

/** How many leads run along each step of the grid. */
function edgesOf(definition: OvenDefinition, routes: Routes): Map<string, number> {
  const edges = new Map<string, number>();
  for (const { ref } of definition.leads) {
    const way = routes.get(ref) ?? [];
    way.forEach((point, i) => {
      const before = way[i - 1];
      if (!before) return;
      const key = edgeKey(before, point);
      edges.set(key, (edges.get(key) ?? 0) + 1);
    });
  }
  return edges;
}

/** Steps to leave out at a lifted end: what it shares with its neighbours on the terminal, and one of its own. */
function openAfter(way: readonly BenchPoint[], edges: ReadonlyMap<string, number>): number {
  let steps = 0;
  for (let i = 1; i < way.length; i += 1) {
    if ((edges.get(edgeKey(way[i - 1]!, way[i]!)) ?? 0) < 2) break;
    steps = i;
  }
  return steps + 1;
}

/** Leaves out steps at both ends, but never the whole lead: two steps that are left too few meet in the middle. */
function trim(way: readonly BenchPoint[], atStart: number, atEnd: number): BenchPoint[] {
  const last = way.length - 1;
  const from = Math.min(atStart, last);
  const to = Math.max(last - atEnd, 0);
  if (from < to) return way.slice(from, to + 1);
  const [a, b] = [way[Math.max(from - 1, 0)]!, way[Math.min(to + 1, last)]!];
  const at = (share: number): BenchPoint => [
    a[0] + (b[0] - a[0]) * share,
    a[1] + (b[1] - a[1]) * share,
  ];
  return [atStart > 0 ? at(0.35) : a, atEnd > 0 ? at(0.65) : b];
}

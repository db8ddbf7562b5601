import type { OvenLayout } from '../../../shared/oven/layout.ts';
import type { OvenDefinition } from '../../../shared/oven/oven.ts';
import type { BenchPoint } from '../geometry/bench-point.ts';
import type { PlacedLabel } from '../geometry/place-labels.ts';
import { labelDiagram } from './label-diagram.ts';
import { placeSymbol, type PlacedSymbol } from './place-symbol.ts';
import { makeGrid, type Grid } from './routing/grid.ts';
import { routeLeads, type Routes } from './routing/route-leads.ts';

/** The wiring diagram of one oven as its maker draws it: every lead at home, nothing of the bench in it. */
export interface Diagram {
  size: BenchPoint;
  symbols: readonly PlacedSymbol[];
  /** where each terminal is, by reference */ places: Readonly<Record<string, BenchPoint>>;
  grid: Grid;
  routes: Routes;
  /** by reference of the part, terminal or lead */ labels: ReadonlyMap<string, PlacedLabel>;
}

/** Places symbols, leads and labels. Pure; takes some hundred milliseconds, so keep the result. */
export function buildDiagram(definition: OvenDefinition, { diagram }: OvenLayout): Diagram {
  const symbols = definition.parts.flatMap((part) => {
    const place = diagram.parts[part.ref];
    return place ? [placeSymbol(part, place)] : [];
  });
  const places: Record<string, BenchPoint> = Object.assign(
    {},
    ...symbols.map(({ terminals }) => terminals),
  );
  const grid = makeGrid(diagram.size, symbols);
  const trips = definition.leads.flatMap(({ ref, ends }) => {
    const [from, to] = [places[ends[0]], places[ends[1]]];
    return from && to ? [{ ref, from, to }] : [];
  });
  const routes = routeLeads(grid, trips);
  return {
    size: diagram.size,
    symbols,
    places,
    grid,
    routes,
    labels: labelDiagram(definition, diagram.size, symbols, routes),
  };
}

/** Which way a lead passes a node: 0 along the row, 1 along the column, 2 it turns or ends there. */
type Axis = 0 | 1 | 2;

/** One lead to be routed, by the nodes of its two terminals. */
export interface Trip {
  ref: string;
  from: number;
  to: number;
}

interface Use {
  trip: Trip;
  axis: Axis;
}

/** Two leads that sit on the same terminal are one there: they may run together. */
export const meet = (a: Trip, b: Trip): boolean =>
  a.from === b.from || a.from === b.to || a.to === b.from || a.to === b.to;

/** Where leads run already. An edge is named by its lesser node, twice, plus one when it goes down. */
export class Traffic {
  readonly #nodes = new Map<number, Use[]>();
  readonly #edges = new Map<number, Trip[]>();

  static edge(from: number, to: number): number {
    const isAcross = Math.abs(from - to) === 1;
    return Math.min(from, to) * 2 + (isAcross ? 0 : 1);
  }

  at(node: number): readonly Use[] {
    return this.#nodes.get(node) ?? [];
  }

  on(from: number, to: number): readonly Trip[] {
    return this.#edges.get(Traffic.edge(from, to)) ?? [];
  }

  add(trip: Trip, way: readonly number[]): void {
    way.forEach((node, i) => {
      const before = way[i - 1];
      const after = way[i + 1];
      const uses = this.#nodes.get(node) ?? [];
      uses.push({ trip, axis: axisOf(before, node, after) });
      this.#nodes.set(node, uses);
      if (after === undefined) return;
      const edge = Traffic.edge(node, after);
      this.#edges.set(edge, [...(this.#edges.get(edge) ?? []), trip]);
    });
  }

  remove(trip: Trip, way: readonly number[]): void {
    way.forEach((node, i) => {
      this.#nodes.set(
        node,
        this.at(node).filter((use) => use.trip !== trip),
      );
      const after = way[i + 1];
      if (after !== undefined)
        this.#edges.set(
          Traffic.edge(node, after),
          this.on(node, after).filter((one) => one !== trip),
        );
    });
  }
}

function axisOf(before: number | undefined, node: number, after: number | undefined): Axis {
  if (before === undefined || after === undefined) return 2;
  if (node - before !== after - node) return 2;
  return Math.abs(node - before) === 1 ? 0 : 1;
}

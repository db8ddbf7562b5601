import type { OvenLayout } from '../../shared/oven/layout.ts';
import type { OvenDefinition } from '../../shared/oven/oven.ts';

export interface Oven {
  definition: OvenDefinition;
  layout: OvenLayout;
}

/** The ovens that were read at start, by id. */
export class OvenLibrary {
  readonly #ovens: ReadonlyMap<string, Oven>;

  constructor(ovens: readonly Oven[]) {
    this.#ovens = new Map(ovens.map((oven) => [oven.definition.id, oven]));
  }

  list(): Oven[] {
    return [...this.#ovens.values()];
  }

  find(id: string): Oven | null {
    return this.#ovens.get(id) ?? null;
  }
}

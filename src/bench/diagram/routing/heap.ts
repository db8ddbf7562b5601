interface Entry {
  key: number;
  cost: number;
  /** of equals the first in comes out first, so that routes are the same on every machine */ order: number;
}

/** A binary heap, the cheapest on top. */
export class Heap {
  readonly #entries: Entry[] = [];
  #order = 0;

  push(key: number, cost: number): void {
    const entries = this.#entries;
    entries.push({ key, cost, order: this.#order++ });
    let child = entries.length - 1;
    while (child > 0) {
      const parent = (child - 1) >> 1;
      if (!this.#isBefore(child, parent)) return;
      this.#swap(child, parent);
      child = parent;
    }
  }

  pop(): number | null {
    const top = this.#entries[0];
    const last = this.#entries.pop();
    if (top === undefined || last === undefined) return null;
    if (this.#entries.length === 0) return top.key;
    this.#entries[0] = last;
    this.#sink();
    return top.key;
  }

  #sink(): void {
    let parent = 0;
    for (;;) {
      const left = 2 * parent + 1;
      let least = parent;
      if (left < this.#entries.length && this.#isBefore(left, least)) least = left;
      if (left + 1 < this.#entries.length && this.#isBefore(left + 1, least)) least = left + 1;
      if (least === parent) return;
      this.#swap(parent, least);
      parent = least;
    }
  }

  #isBefore(a: number, b: number): boolean {
    const one = this.#entries[a]!;
    const other = this.#entries[b]!;
    return one.cost < other.cost || (one.cost === other.cost && one.order < other.order);
  }

  #swap(a: number, b: number): void {
    const one = this.#entries[a]!;
    this.#entries[a] = this.#entries[b]!;
    this.#entries[b] = one;
  }
}

import type { WireEvent } from '../../shared/bench/event.ts';

/** Both went through JSON once, so equal steps are equal texts but for the order of their fields. */
export const isSameStep = (a: WireEvent | undefined, b: WireEvent): boolean =>
  a !== undefined &&
  a.type === b.type &&
  a.benchMs === b.benchMs &&
  sorted(a.data) === sorted(b.data);

const sorted = (value: unknown): string =>
  JSON.stringify(value, (_key, held: unknown) =>
    held !== null && typeof held === 'object' && !Array.isArray(held)
      ? Object.fromEntries(Object.entries(held).sort(([a], [b]) => (a < b ? -1 : 1)))
      : held,
  );

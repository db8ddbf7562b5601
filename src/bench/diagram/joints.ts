import type { BenchPoint } from '../geometry/bench-point.ts';

/** Where leads that run together from one terminal part: three or more ways meet at a point that is no terminal. */
export function jointsOf(
  ways: readonly (readonly BenchPoint[])[],
  terminals: readonly BenchPoint[],
): BenchPoint[] {
  const arms = new Map<string, Map<string, number>>();
  const isTerminal = new Set(terminals.map((at) => at.join()));
  for (const way of ways)
    way.forEach((point, i) => {
      const here = arms.get(point.join()) ?? new Map<string, number>();
      for (const next of [way[i - 1], way[i + 1]])
        if (next) here.set(next.join(), (here.get(next.join()) ?? 0) + 1);
      arms.set(point.join(), here);
    });
  return [...arms]
    .filter(([key, here]) => {
      const shared = [...here.values()].some((count) => count > 1);
      return here.size > 2 && shared && !isTerminal.has(key);
    })
    .map(([key]) => key.split(',').map(Number) as unknown as BenchPoint);
}

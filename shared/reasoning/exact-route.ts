import { log2 } from './binary-logarithm.ts';

/**
 * The least expected cost of finding which candidate it is, when every candidate gives one outcome a
 * test: C(S) = min over tests of cost + sum over outcomes of P(S_o | S) C(S_o), C of one group = 0,
 * by recursion over the subsets met. What an AO* search finds (K. R. Pattipati and M. G. Alexandridis,
 * IEEE Trans. SMC 20 (1990) 872-887, from memory), for sets small enough to try everything.
 */
export interface TestProblem {
  readonly weights: readonly number[];
  readonly tests: readonly {
    readonly seconds: number;
    /** by candidate */ readonly outcomes: readonly number[];
  }[];
}

/** Expected s; candidates that no test tells apart count as found together. At most 20 candidates. */
export function exactCost(problem: TestProblem): number {
  const known = new Map<number, number>();
  const costOf = (set: number): number => {
    const found = known.get(set);
    if (found !== undefined) return found;
    const costs = splits(problem, set).map(
      ({ seconds, parts }) =>
        seconds +
        parts.reduce(
          (sum, part) => sum + (weightOf(problem, part) / weightOf(problem, set)) * costOf(part),
          0,
        ),
    );
    const least = costs.length === 0 ? 0 : Math.min(...costs);
    known.set(set, least);
    return least;
  };
  return costOf((1 << problem.weights.length) - 1);
}

/** The same when each test is the one that tells most per second, looked at one step ahead. */
export function greedyCost(problem: TestProblem): number {
  const bits = (set: number, parts: readonly number[]): number =>
    parts.reduce((sum, part) => {
      const share = weightOf(problem, part) / weightOf(problem, set);
      return sum - share * log2(share);
    }, 0);
  const best = (set: number) =>
    splits(problem, set).reduce<{ seconds: number; parts: number[]; bits: number } | null>(
      (most, { seconds, parts }) => {
        const told = bits(set, parts);
        return most === null || told / seconds > most.bits / most.seconds
          ? { seconds, parts, bits: told }
          : most;
      },
      null,
    );
  const ahead = (set: number) =>
    splits(problem, set)
      .map((split) => {
        const next = split.parts.map((part) => ({ part, then: best(part) }));
        const share = (part: number) => weightOf(problem, part) / weightOf(problem, set);
        const told = next.reduce(
          (sum, { part, then }) => sum + share(part) * (then?.bits ?? 0),
          bits(set, split.parts),
        );
        const seconds = next.reduce(
          (sum, { part, then }) => sum + share(part) * (then?.seconds ?? 0),
          split.seconds,
        );
        return { ...split, rate: told / seconds };
      })
      .reduce<{ seconds: number; parts: number[]; rate: number } | null>(
        (most, one) => (most === null || one.rate > most.rate ? one : most),
        null,
      );
  const costOf = (set: number): number => {
    const split = ahead(set);
    if (split === null) return 0;
    return (
      split.seconds +
      split.parts.reduce(
        (sum, part) => sum + (weightOf(problem, part) / weightOf(problem, set)) * costOf(part),
        0,
      )
    );
  };
  return costOf((1 << problem.weights.length) - 1);
}

/** The tests that divide a set, and what they divide it into. Sets are bits. */
function splits({ tests }: TestProblem, set: number): { seconds: number; parts: number[] }[] {
  return tests.flatMap(({ seconds, outcomes }) => {
    const parts = new Map<number, number>();
    outcomes.forEach((outcome, c) => {
      if (set & (1 << c)) parts.set(outcome, (parts.get(outcome) ?? 0) | (1 << c));
    });
    return parts.size > 1 ? [{ seconds, parts: [...parts.values()] }] : [];
  });
}

const weightOf = ({ weights }: TestProblem, set: number): number =>
  weights.reduce((sum, weight, c) => (set & (1 << c) ? sum + weight : sum), 0);

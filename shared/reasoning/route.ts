import type { AtBench } from './bench-work.ts';
import { after, atTheStart, MAKE_SAFE_SECONDS } from './bench-work.ts';
import type { Knowledge } from './next-measurement.ts';
import { rankedMeasurements } from './next-measurement.ts';
import { entropy, isConsistent, posterior } from './posterior.ts';

export interface RouteStep {
  readonly line: number;
  readonly seconds: number;
  /** class of the outcome */ readonly seen: number;
  /** candidates that still explain everything, as `count` counts them */ readonly left: number;
}

export interface Route {
  readonly steps: readonly RouteStep[];
  /** s, making safe included */ readonly seconds: number;
  /** probability of the candidate looked for at the end */ readonly certainty: number;
}

/** How many of the best next measurements are looked past, and how many steps a route may have. */
const LOOKED_PAST = 3;
const MOST_STEPS = 20;
/** Probability at which a technician stops measuring. Judgement. */
const SURE = 0.95;

/**
 * The shortest safe route to a candidate that a technician who does not know it would take: made safe
 * first, then greedily the measurement that tells most per second, looked at one step ahead; the
 * outcome is what the candidate most often gives. `isSought` names the candidates that count as found.
 */
export function shortestRoute(
  knowledge: Knowledge,
  priors: readonly number[],
  truth: number,
  isSought: (candidate: number) => boolean,
  count: (candidates: ReadonlySet<number>) => number = ({ size }) => size,
): Route {
  let at: AtBench = { ...atTheStart, isMadeSafe: true };
  let weights = [...priors];
  const consistent = new Set(priors.keys());
  const steps: RouteStep[] = [];
  let seconds = MAKE_SAFE_SECONDS;
  const done = new Set<number>();
  const certainty = (): number =>
    weights.reduce((sum, weight, c) => (isSought(c) ? sum + weight : sum), 0);
  while (certainty() < SURE && steps.length < MOST_STEPS) {
    const line = bestAhead(knowledge, weights, at, done);
    if (line === null) break;
    done.add(line.line);
    const outcomes = knowledge.outcomes[line.line]!;
    const seen = usualOutcome(outcomes.shares, outcomes.classes, truth);
    weights = posterior(weights, outcomes, seen);
    for (const c of consistent) if (!isConsistent(outcomes, c, seen)) consistent.delete(c);
    at = after(at, knowledge.lines[line.line]!);
    seconds += line.seconds;
    steps.push({ line: line.line, seconds: line.seconds, seen, left: count(consistent) });
  }
  return { steps, seconds, certainty: certainty() };
}

/** Of the best few, the one that with its own best follower tells most per second. */
function bestAhead(
  knowledge: Knowledge,
  weights: readonly number[],
  at: AtBench,
  done: ReadonlySet<number>,
) {
  const ranked = rankedMeasurements(knowledge, weights, at, done).slice(0, LOOKED_PAST);
  const rated = ranked.map((one) => ({ one, rate: rateAhead(knowledge, weights, at, one) }));
  return (
    rated.reduce<(typeof rated)[number] | null>(
      (best, rating) => (best === null || rating.rate > best.rate ? rating : best),
      null,
    )?.one ?? null
  );
}

function rateAhead(
  knowledge: Knowledge,
  weights: readonly number[],
  at: AtBench,
  one: { line: number; bits: number; seconds: number },
): number {
  const outcomes = knowledge.outcomes[one.line]!;
  const then = after(at, knowledge.lines[one.line]!);
  const before = entropy(weights);
  let bits = 0;
  let seconds = one.seconds;
  for (let seen = 0; seen < outcomes.classes; seen += 1) {
    const chance = weights.reduce(
      (sum, weight, c) => sum + weight * outcomes.shares[c * outcomes.classes + seen]!,
      0,
    );
    if (chance < 1e-3) continue;
    const left = posterior(weights, outcomes, seen);
    const [next] = rankedMeasurements(knowledge, left, then);
    bits += chance * (before - entropy(left) + (next?.bits ?? 0));
    seconds += chance * (next?.seconds ?? 0);
  }
  return bits / seconds;
}

export function usualOutcome(shares: Float64Array, classes: number, candidate: number): number {
  let best = 0;
  for (let seen = 1; seen < classes; seen += 1)
    if (shares[candidate * classes + seen]! > shares[candidate * classes + best]!) best = seen;
  return best;
}

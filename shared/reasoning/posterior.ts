import { log2 } from './binary-logarithm.ts';
import type { Outcomes } from './outcomes.ts';

/** Likelihood that nobody falls below: a reading may be a slip, and one digit rules nobody out. Judgement. */
export const FLOOR = 0.002;

/**
 * Probabilities of the candidates after a measurement gave class `seen`: Bayes' rule with the share of
 * the draws as the likelihood, never below the floor.
 */
export function posterior(
  weights: readonly number[],
  { shares, classes }: Pick<Outcomes, 'shares' | 'classes'>,
  seen: number,
): number[] {
  const raw = weights.map((weight, c) => weight * likelihood(shares[c * classes + seen] ?? 0));
  const sum = raw.reduce((total, one) => total + one, 0);
  return raw.map((one) => one / sum);
}

const likelihood = (share: number): number => FLOOR + (1 - FLOOR) * share;

/** Candidates of which some draw gives what was seen. */
export const isConsistent = (
  { shares, classes }: Pick<Outcomes, 'shares' | 'classes'>,
  candidate: number,
  seen: number,
): boolean => (shares[candidate * classes + seen] ?? 0) > 0;

/** bits; H = -sum p log2 p (C. E. Shannon, Bell Syst. Tech. J. 27 (1948) 379-423). */
export const entropy = (weights: readonly number[]): number =>
  weights.reduce((sum, p) => (p > 0 ? sum - p * log2(p) : sum), 0);

/** Of all probability: less moves no decision. */
const NOTHING = 1e-9;

/** bits by which the entropy falls on average when the measurement is made. */
export function expectedFall(
  weights: readonly number[],
  { shares, classes }: Pick<Outcomes, 'shares' | 'classes'>,
): number {
  let after = 0;
  for (let seen = 0; seen < classes; seen += 1) {
    let chance = 0;
    let weighted = 0;
    weights.forEach((weight, c) => {
      const joint = weight * (shares[c * classes + seen] ?? 0);
      if (joint < NOTHING) return;
      chance += joint;
      weighted -= joint * log2(joint);
    });
    if (chance > 0) after += weighted + chance * log2(chance);
  }
  return entropy(weights) - after;
}

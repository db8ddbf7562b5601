/**
 * The next step from the last one's error (1 being what is allowed) by h_new = h 0.9 err^(-1/p).
 * A step that would change by less than a fifth is kept: a linear circuit then needs no factoring.
 * Source: E. Hairer, S. P. Norsett, G. Wanner, Solving Ordinary Differential Equations I, II.4.
 */
import { power } from '../elementary/power.ts';
const SAFETY = 0.9;
const MOST_GROWTH = 10;
const MOST_SHRINKING = 0.1;
const NOT_WORTH_FACTORING = 1.2;

export function nextStep(length: number, error: number, order: number): number {
  const wanted = error > 0 ? SAFETY * power(error, -1 / order) : MOST_GROWTH;
  if (wanted >= 1 && wanted < NOT_WORTH_FACTORING) return length;
  return length * Math.min(MOST_GROWTH, Math.max(MOST_SHRINKING, wanted));
}

/**
 * Splits what is left up to a landing so that no sliver remains: all of it, or half when a full step
 * would leave less than another.
 */
export function fitStep(wanted: number, left: number): number {
  if (wanted >= left * (1 - 1e-9)) return left;
  return wanted > left / 2 ? left / 2 : wanted;
}

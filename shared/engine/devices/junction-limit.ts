import type { Junction } from './diode-law.ts';
import { log } from '../elementary/logarithm.ts';

/**
 * Keeps an iterate of Newton's method where the exponential can be trusted: a forward step beyond
 * the critical voltage is taken in the logarithm of the current instead of in the voltage, and the
 * same is done, mirrored, about the breakdown voltage.
 *
 * Source: L. W. Nagel, SPICE2, memorandum UCB/ERL M520 (1975), junction limiting (from memory).
 */
export function limitJunction(junction: Junction, wanted: number): number {
  const { breakdown, slope, voltage } = junction;
  if (breakdown < Infinity && wanted < Math.min(0, -breakdown + 10 * slope)) {
    const mirrored = limitForward(junction, -(wanted + breakdown), -(voltage + breakdown));
    return -(mirrored + breakdown);
  }
  return limitForward(junction, wanted, voltage);
}

function limitForward(junction: Junction, wanted: number, last: number): number {
  const { slope, critical } = junction;
  if (wanted <= critical || Math.abs(wanted - last) <= 2 * slope) return wanted;
  if (last <= 0) return slope * log(wanted / slope);
  const growth = 1 + (wanted - last) / slope;
  return growth > 0 ? last + slope * log(growth) : critical;
}

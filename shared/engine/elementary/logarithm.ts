/**
 * log and log1p from sums, products and one division, so that every machine gives the same bits.
 *   x = 2^k m, m in [sqrt(1/2), sqrt 2);  s = (m - 1) / (m + 1);  log x = k ln 2 + 2 artanh s,
 *   artanh s = s + s^3 / 3 + s^5 / 5 ..., |s| <= 0.1716, to s^23.
 * Source: W. J. Cody, W. Waite, Software Manual for the Elementary Functions (1980), from memory.
 */
import { LN2_HIGH, LN2_LOW } from './exponential.ts';
import { binaryExponent, powerOfTwo } from './powers-of-two.ts';

const TERMS = 12;

/** Natural logarithm; NaN below zero, -Infinity at zero. */
export function log(x: number): number {
  if (!(x > 0) || x === Infinity) return x === 0 ? -Infinity : x === Infinity ? x : NaN;
  let k = binaryExponent(x);
  // a subnormal's power of two has no reciprocal: scale it up first
  let m = k < -1022 ? x * powerOfTwo(600) * powerOfTwo(-k - 600) : x * powerOfTwo(-k);
  if (m > Math.SQRT2) {
    m /= 2;
    k += 1;
  }
  const s = (m - 1) / (m + 1);
  const s2 = s * s;
  let sum = 0;
  for (let term = TERMS - 1; term >= 1; term -= 1) sum = (sum + 1 / (2 * term + 1)) * s2;
  return k * LN2_HIGH + (2 * s + (2 * s * sum + k * LN2_LOW));
}

/** log(1 + x) with every digit kept near zero. */
export function log1p(x: number): number {
  const grown = 1 + x;
  // (W. Kahan) what rounding took from 1 + x is given back in proportion
  return grown === 1 ? x : log(grown) * (x / (grown - 1));
}

/**
 * exp and expm1 from sums and products alone, so that every machine gives the same bits: ECMAScript
 * leaves Math.exp to each engine, and a diode's current multiplies the difference.
 *   x = k ln 2 + r, |r| <= ln 2 / 2;  exp(x) = 2^k (1 + r + r^2 p(r)), p Taylor's series to r^13,
 * whose remainder is below 5e-18 of the result. ln 2 in two parts (Cody and Waite): k times the first is exact.
 * Source: W. J. Cody, W. Waite, Software Manual for the Elementary Functions (1980), from memory.
 */
import { powerOfTwo } from './powers-of-two.ts';

/** ln 2 cut to 32 bits, and what is left of it */
export const LN2_HIGH = 0.6931471803691238;
export const LN2_LOW = 1.9082149292705877e-10;
const PER_LN2 = 1.4426950408889634;
const OVERFLOW = 709.782712893384;
const UNDERFLOW = -745.1332191019412;

const C3 = 1 / 6;
const C4 = 1 / 24;
const C5 = 1 / 120;
const C6 = 1 / 720;
const C7 = 1 / 5040;
const C8 = 1 / 40320;
const C9 = 1 / 362880;
const C10 = 1 / 3628800;
const C11 = 1 / 39916800;
const C12 = 1 / 479001600;
const C13 = 1 / 6227020800;

/** exp(r) - 1 for |r| <= ln 2 / 2; pairs of terms, so that a processor can work at several at once. */
function tail(r: number): number {
  const r2 = r * r;
  const r4 = r2 * r2;
  const low = 0.5 + C3 * r + (C4 + C5 * r) * r2;
  const middle = C6 + C7 * r + (C8 + C9 * r) * r2;
  const high = C10 + C11 * r + (C12 + C13 * r) * r2;
  return r + r2 * (low + (middle + high * r4) * r4);
}

/** e to the x; Infinity above 709.78, 0 below -745.13. */
export function exp(x: number): number {
  if (!(x <= OVERFLOW)) return Number.isNaN(x) ? x : Infinity;
  if (x < UNDERFLOW) return 0;
  const k = Math.floor(x * PER_LN2 + 0.5);
  const r = x - k * LN2_HIGH - k * LN2_LOW;
  const grown = 1 + tail(r);
  // 2^1024 is no double, 2^-1060 has lost bits: in two steps neither is met.
  if (k > 1023 || k < -1021) {
    const half = k >> 1;
    return grown * powerOfTwo(half) * powerOfTwo(k - half);
  }
  return grown * powerOfTwo(k);
}

/** e to the x, less one, with every digit kept near zero. */
export function expm1(x: number): number {
  return Math.abs(x) < 0.34 ? tail(x) : exp(x) - 1;
}

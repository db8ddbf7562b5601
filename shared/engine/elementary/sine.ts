/**
 * sin and cos from sums and products, so that every machine gives the same bits.
 *   x = k pi/2 + r, |r| <= pi/4, pi/2 in four parts of which k times each of the first three is exact
 *   for |k| < 2^28; then Taylor's series to r^17 and r^16, remainder below 1e-17.
 * Source: W. J. Cody, W. Waite, Software Manual for the Elementary Functions (1980), from memory.
 */
const PER_QUARTER = 0.6366197723675814;
/** pi/2 in steps of about 26 bits, by long division from 80 digits of pi */
const QUARTER_1 = 1.5707963109016418;
const QUARTER_2 = 1.5893254712295857e-8;
const QUARTER_3 = 6.123233601181349e-17;
const QUARTER_4 = 3.9455541665632055e-24;
/** rad; beyond, the angle is first brought within a turn, and its own last bit is worth more than the loss */
const FURTHEST = 4e8;

function sineNearZero(r: number): number {
  const r2 = r * r;
  const r4 = r2 * r2;
  const low = -1 / 6 + r2 / 120;
  const middle = -1 / 5040 + r2 / 362880;
  const high = -1 / 39916800 + r2 / 6227020800;
  const last = -1 / 1307674368000 + r2 / 355687428096000;
  return r + r * r2 * (low + (middle + (high + last * r4) * r4) * r4);
}

function cosineNearZero(r: number): number {
  const r2 = r * r;
  const r4 = r2 * r2;
  const low = 1 / 24 - r2 / 720;
  const middle = 1 / 40320 - r2 / 3628800;
  const high = 1 / 479001600 - r2 / 87178291200;
  return 1 - 0.5 * r2 + r4 * (low + (middle + (high + r4 / 20922789888000) * r4) * r4);
}

/** sin(x + quarters pi/2); NaN for what is not finite. */
function turned(x: number, quarters: number): number {
  const near = Math.abs(x) <= FURTHEST ? x : x % (2 * Math.PI);
  const k = Math.floor(near * PER_QUARTER + 0.5);
  const r = near - k * QUARTER_1 - k * QUARTER_2 - k * QUARTER_3 - k * QUARTER_4;
  switch ((k + quarters) & 3) {
    case 0:
      return sineNearZero(r);
    case 1:
      return cosineNearZero(r);
    case 2:
      return -sineNearZero(r);
    default:
      return -cosineNearZero(r);
  }
}

/** x in rad */
export const sin = (x: number): number => turned(x, 0);

/** x in rad */
export const cos = (x: number): number => turned(x, 1);

const LEAST = -1074;
const MOST = 1023;

const powers = new Float64Array(MOST - LEAST + 1);
for (let k = LEAST, power = 5e-324; k <= MOST; k += 1, power *= 2) powers[k - LEAST] = power;

/** 2^k, exact, for whole k; beyond what a double holds 0 or Infinity. */
export function powerOfTwo(k: number): number {
  if (k < LEAST) return 0;
  return powers[k - LEAST] ?? Infinity;
}

/** The k with 2^k <= x < 2^(k + 1), for x > 0 and finite. */
export function binaryExponent(x: number): number {
  let low = LEAST;
  let high = MOST + 1;
  while (high - low > 1) {
    const middle = (low + high) >> 1;
    if (powerOfTwo(middle) <= x) low = middle;
    else high = middle;
  }
  return low;
}

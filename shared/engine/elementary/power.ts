import { exp } from './exponential.ts';
import { log } from './logarithm.ts';

/** base^exponent for a positive base, to some 1e-15 of |exponent log base|; the same bits on every machine. */
export const power = (base: number, exponent: number): number => exp(exponent * log(base));

/** 10^n for whole n, the nearest double: what a number's own notation gives. */
export const powerOfTen = (n: number): number => Number(`1e${n}`);

export const square = (x: number): number => x * x;

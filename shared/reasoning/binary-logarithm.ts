import { log } from '../engine/elementary/logarithm.ts';

/** log2 x = ln x / ln 2, the same bits on every machine. */
export const log2 = (x: number): number => log(x) / Math.LN2;

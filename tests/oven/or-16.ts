import { loadOven, onBench } from './oven-on-bench.ts';

/** The over-the-range oven. */
export const or16 = loadOven('brackwell-or-16');
export const or16OnBench = onBench(or16);

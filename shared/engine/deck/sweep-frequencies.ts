import { log } from '../elementary/logarithm.ts';
import { power } from '../elementary/power.ts';

export type Spacing = 'dec' | 'oct' | 'lin';

/**
 * The frequencies (Hz) of `.ac SPACING count first last`, or undefined when there are more than
 * `most`. `lin` has `count` points from first to last; `oct` has `count` an octave, as far as they
 * go; `dec` has `count` a decade, rounded down to a whole number of equal ratios that end on `last`.
 * These are the points ngspice 39 was seen to use.
 */
export function sweepFrequencies(
  spacing: Spacing,
  count: number,
  first: number,
  last: number,
  most: number,
): readonly number[] | undefined {
  const intervals = intervalsOf(spacing, count, first, last);
  if (intervals + 1 > most) return undefined;
  if (intervals === 0) return [first];
  const at = (point: number): number => {
    switch (spacing) {
      case 'lin':
        return first + ((last - first) * point) / intervals;
      case 'oct':
        return first * power(2, point / count);
      case 'dec':
        return first * power(last / first, point / intervals);
    }
  };
  return Array.from({ length: intervals + 1 }, (_, point) => at(point));
}

/** A ratio meant to be whole may come out a rounding below it. */
const ROUNDING = 1e-9;

function intervalsOf(spacing: Spacing, count: number, first: number, last: number): number {
  if (first === last) return 0;
  switch (spacing) {
    case 'lin':
      return count - 1;
    case 'oct':
      return Math.floor((log(last / first) / Math.LN2) * count + ROUNDING);
    case 'dec':
      return Math.floor((log(last / first) / Math.LN10) * count + ROUNDING);
  }
}

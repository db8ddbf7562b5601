import type { MeterDefinition } from '../instruments/meter.ts';
import { settingOf } from '../instruments/meters.ts';
import type { FaultTable } from './fault-table.ts';
import { OVER_RANGE } from './fault-table.ts';

/**
 * What one measurement can give, as classes that a technician can tell apart, OL one of its own:
 * predicted readings of all candidates in order, cut wherever two neighbours lie further apart than
 * the meter's error either way.
 */
export interface Outcomes {
  readonly classes: number;
  /** share of the draws in each class: candidate by candidate, class by class */
  readonly shares: Float64Array;
  /** class of a display's counts (OVER_RANGE for OL); the nearest where none was predicted */
  classOf(counts: number): number;
}

/** Counts by which a reading may be off its true value. */
export function errorOf(meter: MeterDefinition, settingId: string, counts: number): number {
  const setting = settingOf(meter, settingId);
  if (!setting || setting.function === 'off') return 0;
  return (setting.spec.percent / 100) * Math.abs(counts) + setting.spec.digits;
}

/** The outcomes of every line of a fault table. */
export function outcomesOf(table: FaultTable, meter: MeterDefinition): Outcomes[] {
  const draws = table.seeds.length;
  return table.lines.map(({ setting }, line) => {
    const start = (candidate: number): number => (candidate * table.lines.length + line) * draws;
    const all = table.candidates.flatMap((_, c) => [
      ...table.counts.subarray(start(c), start(c) + draws),
    ]);
    const classes = classesOf(all, (counts) => errorOf(meter, setting, counts));
    const shares = new Float64Array(table.candidates.length * classes.count);
    for (let c = 0; c < table.candidates.length; c += 1)
      for (let s = 0; s < draws; s += 1) {
        const found = classes.of(table.counts[start(c) + s]!);
        shares[c * classes.count + found]! += 1 / draws;
      }
    return { classes: classes.count, shares, classOf: classes.of };
  });
}

/** Readings cut into classes where the gap is wider than the errors of both sides. */
export function classesOf(
  readings: readonly number[],
  error: (counts: number) => number,
): { count: number; of: (counts: number) => number } {
  const numbers = [...new Set(readings.filter((counts) => counts !== OVER_RANGE))].sort(
    (p, q) => p - q,
  );
  /** upper end of each class but the last */
  const cuts = numbers.flatMap((counts, at) => {
    const next = numbers[at + 1];
    return next !== undefined && next - counts > error(next) + error(counts)
      ? [(counts + next) / 2]
      : [];
  });
  const count = cuts.length + 2;
  return {
    count,
    of: (counts) => {
      if (counts === OVER_RANGE) return count - 1;
      const at = cuts.findIndex((cut) => counts <= cut);
      return at < 0 ? cuts.length : at;
    },
  };
}

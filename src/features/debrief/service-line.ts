import type { ShownReading } from '../../../shared/bench/record.ts';
import type { ServiceMeasurement } from '../../../shared/oven/oven.ts';

const scales: Readonly<Record<string, number>> = {
  n: 1e-9,
  µ: 1e-6,
  μ: 1e-6,
  m: 1e-3,
  k: 1e3,
  M: 1e6,
  G: 1e9,
};

/** What one of the unit is in SI: 1000 for kΩ. A unit of one letter has no prefix. */
const scaleOf = (unit: string): number => (unit.length > 1 ? (scales[unit.charAt(0)] ?? 1) : 1);

const functionOf = (setting: string): string => setting.split('-')[0] ?? setting;

/** Those that fit the rule, or all when none does. */
const preferring = <T>(all: readonly T[], rule: (one: T) => boolean): readonly T[] => {
  const fitting = all.filter(rule);
  return fitting.length > 0 ? fitting : all;
};

/**
 * The line of the service data that asks for this reading: same terminals and function, and where several
 * do, the same range and the same way round. None when it stays unclear, and none for an over-range on
 * another range than the line's: that says nothing about its limits.
 */
export const serviceLineOf = (
  reading: ShownReading,
  lines: readonly ServiceMeasurement[],
): ServiceMeasurement | undefined => {
  const asking = lines.filter(
    ({ between, setting }) =>
      functionOf(setting) === functionOf(reading.setting) &&
      between.includes(reading.red) &&
      between.includes(reading.black),
  );
  const sameRange = preferring(asking, ({ setting }) => setting === reading.setting);
  const [line, ...others] = preferring(sameRange, ({ between }) => between[0] === reading.red);
  if (!line || others.length > 0) return undefined;
  return reading.value === null && line.setting !== reading.setting ? undefined : line;
};

export const isWithin = (reading: ShownReading, line: ServiceMeasurement): boolean => {
  const scale = scaleOf(line.unit);
  switch (line.expect) {
    case 'open':
      return reading.value === null;
    case 'beep':
      return reading.isBeeping;
    case 'range':
      return (
        reading.value !== null &&
        reading.value >= (line.low ?? -Infinity) * scale &&
        reading.value <= (line.high ?? Infinity) * scale
      );
  }
};

/** "80 to 120 Ω", "under 1 Ω", "open". */
export const limitsText = ({ expect, low, high, unit }: ServiceMeasurement): string => {
  switch (expect) {
    case 'open':
      return 'open';
    case 'beep':
      return 'beep';
    case 'range':
      if (low === undefined && high === undefined) return `any ${unit}`;
      if (low === undefined) return `up to ${high} ${unit}`;
      return high === undefined ? `from ${low} ${unit}` : `${low} to ${high} ${unit}`;
  }
};

/**
 * Where the reading stands on a bar whose limits are at 0.3 and 0.7, 0 to 1; null when the line has
 * not both limits or the reading is over range.
 */
export const placeOnBar = (reading: ShownReading, line: ServiceMeasurement): number | null => {
  if (line.expect !== 'range' || reading.value === null) return null;
  const { low, high } = line;
  if (low === undefined || high === undefined || high <= low) return null;
  const inUnit = reading.value / scaleOf(line.unit);
  return Math.min(0.97, Math.max(0.03, 0.3 + (0.4 * (inUnit - low)) / (high - low)));
};

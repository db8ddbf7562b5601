import { log } from '../elementary/logarithm.ts';
import { powerOfTen } from '../elementary/power.ts';

/** Prefixes of the SI by powers of a thousand, from pico to tera. */
const PREFIXES = ['p', 'n', 'µ', 'm', '', 'k', 'M', 'G', 'T'] as const;
const NO_PREFIX = PREFIXES.indexOf('');

/**
 * A value in engineering notation: `formatQuantity(94.8, 'Ω')` is `94.8 Ω`, of 22.6e6 `22.6 MΩ`.
 * `digits` are significant digits, three unless told; zeros after them are left off. Beyond tera or
 * below pico the last prefix is kept. What is not a number reads `–`, an infinity `∞`.
 */
export function formatQuantity(value: number, unit: string, digits: number = 3): string {
  if (Number.isNaN(value)) return `– ${unit}`;
  const sign = value < 0 ? '-' : '';
  const size = Math.abs(value);
  if (size === Infinity) return `${sign}∞ ${unit}`;
  if (size === 0) return `0 ${unit}`;
  // rounding first, so that 999.6 carries into the next prefix
  const rounded = Number(size.toPrecision(digits));
  const thousands = Math.floor(Math.floor(log(rounded) / Math.LN10 + 1e-12) / 3);
  const place = Math.min(PREFIXES.length - 1, Math.max(0, thousands + NO_PREFIX));
  const scaled = Number((rounded / powerOfTen(3 * (place - NO_PREFIX))).toPrecision(digits));
  return `${sign}${scaled} ${PREFIXES[place]!}${unit}`;
}

import type { WireEvent } from './event.ts';

/** Relative. The engine gives the same bits everywhere; this is what a number may lose on its way through text and back. */
const tolerance = 1e-9;

/** Two machines' accounts of one event: the same, numbers to a billionth. */
export const isSameEvent = (a: WireEvent, b: WireEvent): boolean =>
  a.type === b.type && a.benchMs === b.benchMs && isSame(a.data, b.data);

function isSame(a: unknown, b: unknown): boolean {
  if (typeof a === 'number' && typeof b === 'number')
    return Math.abs(a - b) <= tolerance * Math.max(Math.abs(a), Math.abs(b));
  if (Array.isArray(a) && Array.isArray(b))
    return a.length === b.length && a.every((one, i) => isSame(one, b[i]));
  if (isRecord(a) && isRecord(b)) {
    const keys = new Set([...Object.keys(a), ...Object.keys(b)]);
    return [...keys].every((key) => isSame(a[key], b[key]));
  }
  return a === b;
}

const isRecord = (value: unknown): value is Record<string, unknown> =>
  value !== null && typeof value === 'object';

import type { WireEvent } from './event.ts';

/**
 * Relative. `exp` and `sin` may differ in the last bit between JavaScript engines; what a run leaves
 * behind moves by some thousandths with the steps it was integrated in.
 */
const tolerance = 1e-2;
/**
 * A powered run adds up thousands of half waves: with last bits of `exp` and `sin` that differ, Node 20
 * and Chromium 156 left 581 and 567 V on the capacitor of one and the same oven, at powers 0.3 % apart.
 */
const runTolerance = 5e-2;
/** W, K, A, and V on a capacitor: beside a run's own size this is nothing, beside none at all it is a difference. */
const runSlack: Record<string, number> = {
  microwavePower: 10,
  waterRise: 0.1,
  current: 0.1,
  charge: 20,
};

/** Two machines' accounts of one event: equal, numbers nearly so, a display within one count. */
export const isSameEvent = (a: WireEvent, b: WireEvent): boolean =>
  a.type === b.type &&
  a.benchMs === b.benchMs &&
  isSame(a.data, b.data, {
    key: 'data',
    slack: 0,
    isRun: a.type === 'OvenRun',
    share: a.type === 'OvenRun' ? runTolerance : tolerance,
  });

interface Judging {
  /** the field under which the two stand */ key: string;
  /** absolute */ slack: number;
  /** relative */ share: number;
  isRun: boolean;
}

function isSame(a: unknown, b: unknown, how: Judging): boolean {
  const { key, slack, share, isRun } = how;
  if (key === 'display' && typeof a === 'string' && typeof b === 'string')
    return isWithinCount(a, b);
  // They follow from the display, on which the judgement is made.
  if (key === 'isSettled') return typeof a === typeof b;
  if (typeof a === 'number' && typeof b === 'number') {
    return Math.abs(a - b) <= share * Math.max(Math.abs(a), Math.abs(b)) + slack + 1e-9;
  }
  if (Array.isArray(a) && Array.isArray(b)) {
    return a.length === b.length && a.every((one, i) => isSame(one, b[i], how));
  }
  if (a !== null && b !== null && typeof a === 'object' && typeof b === 'object') {
    const keys = new Set([...Object.keys(a), ...Object.keys(b)]);
    const worth = countWorth(a);
    return [...keys].every((one) =>
      isSame((a as Record<string, unknown>)[one], (b as Record<string, unknown>)[one], {
        key: one,
        slack: Math.max(worth, isRun ? (runSlack[one] ?? (key === 'charge' ? slack : 0)) : 0),
        share,
        isRun,
      }),
    );
  }
  return a === b;
}

/** SI per unit shown */
const scale: Record<string, number> = {
  Ω: 1,
  kΩ: 1e3,
  MΩ: 1e6,
  V: 1,
  mV: 1e-3,
  nF: 1e-9,
  µF: 1e-6,
};

/** Beside a display, a number may move by what one count of that display is worth. */
function countWorth(holder: object): number {
  const { display, unit } = holder as { display?: unknown; unit?: unknown };
  if (typeof display !== 'string' || typeof unit !== 'string') return 0;
  return 1.5 * 10 ** -decimalsOf(display) * (scale[unit] ?? 1);
}

const decimalsOf = (text: string): number => text.split('.')[1]?.length ?? 0;

/** "94.8" and "94.9": the same decimals, one count apart. */
function isWithinCount(a: string, b: string): boolean {
  if (a === b) return true;
  if (decimalsOf(a) !== decimalsOf(b)) return false;
  const apart = Math.abs(Number(a) - Number(b)) * 10 ** decimalsOf(a);
  return Number.isFinite(apart) && apart < 1.5;
}

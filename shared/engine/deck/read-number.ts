import type { Result } from '../circuit/circuit.ts';
import { quote } from './quote.ts';

/**
 * A number of the deck notation: `1.5`, `4.7k`, `10meg`, `2.2uF`, `60Hz`.
 * Letters after a scale suffix are ignored, so `1F` is a femto and `1M` a milli, as in SPICE.
 * Letters that are neither a suffix nor a unit are refused rather than dropped: a slip such as
 * `10q` would otherwise be read as 10.
 * Source of the suffixes: ngspice manual, section on scale factors.
 */
export function readNumber(text: string): Result<number, string> {
  const match = NUMBER.exec(text.toLowerCase());
  if (match === null) return { ok: false, failure: `${quote(text)} is not a number` };
  const letters = match[2] ?? '';
  const exponent = exponentOf(letters);
  if (exponent === undefined) {
    return { ok: false, failure: `${quote(text)} has an unknown suffix ${quote(letters)}` };
  }
  // as decimal text, so that 4.7k is exactly what 4700 is
  const value = scale(match[1]!, exponent);
  return Number.isFinite(value)
    ? { ok: true, value }
    : { ok: false, failure: `${quote(text)} is too large a number` };
}

const NUMBER = /^([+-]?(?:\d+\.?\d*|\.\d+)(?:e[+-]?\d+)?)([a-z]*)$/;

const EXPONENTS: ReadonlyMap<string, number> = new Map([
  ['t', 12],
  ['g', 9],
  ['k', 3],
  ['m', -3],
  ['u', -6],
  ['n', -9],
  ['p', -12],
  ['f', -15],
]);

const UNITS =
  /^(v|volts?|a|amps?|amperes?|r|ohms?|h|henrys?|henries|hz|hertz|s|secs?|seconds?|w|watts?|deg|degrees?)$/;

function exponentOf(letters: string): number | undefined {
  if (letters === '') return 0;
  if (letters.startsWith('meg')) return 6;
  // other programs read `mil` as a length of 25.4 um: neither reading is safe
  if (letters.startsWith('mil')) return undefined;
  return EXPONENTS.get(letters.charAt(0)) ?? (UNITS.test(letters) ? 0 : undefined);
}

function scale(digits: string, exponent: number): number {
  const [mantissa, written] = digits.split('e');
  return Number(`${mantissa}e${Number(written ?? 0) + exponent}`);
}

import type { OvenState } from '../../../shared/oven/oven-state.ts';

const partOf = (terminal: string): string => terminal.split('.')[0] ?? terminal;

/**
 * The part whose metal a target is: a terminal's own part; for a lifted lead end the part at the
 * lead's other end. Null: a loose lead on both ends, or a bench tool.
 */
export function partOfTarget(oven: OvenState, target: string): string | null {
  if (target.startsWith('BAT.')) return null;
  const end = /^(W[0-9]+)\/([ab])$/.exec(target);
  if (!end) return partOf(target);
  const other = oven.leadEnds[`${end[1]}/${end[2] === 'a' ? 'b' : 'a'}`] ?? null;
  return other === null ? null : partOf(other);
}

/** The part that a reading between two targets says something about: not the chassis when there is another. */
export function partOfReading(oven: OvenState, red: string, black: string): string | null {
  const parts = [partOfTarget(oven, red), partOfTarget(oven, black)].filter(
    (part) => part !== null,
  );
  return parts.find((part) => part !== 'CH') ?? parts[0] ?? null;
}

import { switchOverdrive } from '../devices/switch.ts';
import type { Machine } from './machine.ts';

/** V by which each switch's control is past its threshold; above zero it must turn. */
export const overdrives = ({ system, switches }: Machine): number[] =>
  switches.map((state) => switchOverdrive(system, state));

/** Share of the step at which the first control crosses; Infinity when none does. */
export function turningAt(before: readonly number[], after: readonly number[]): number {
  let first = Infinity;
  after.forEach((late, at) => {
    const early = Math.min(0, before[at]!);
    if (late > 0) first = Math.min(first, early / (early - late));
  });
  return first;
}

import { square } from '../../engine/elementary/power.ts';
import type { DrawnOven, OvenState } from '../../oven/oven-state.ts';
import { partKinds } from '../../oven/parts/catalogue.ts';
import { meltingTime } from './fuse-melting.ts';
import type { Electrical } from './run-electrically.ts';

/** Every part with an element that melts: line fuses, high-voltage fuses. */
export const fusesOf = (oven: DrawnOven): string[] =>
  oven.definition.parts
    .filter(({ kind }) => partKinds[kind].running?.melts !== undefined)
    .map(({ ref }) => ref);

/** s until this fuse melts at what flows in `ran`; Infinity: it holds. */
export function fuseTime(oven: DrawnOven, state: OvenState, ref: string, ran: Electrical): number {
  const kind = oven.definition.parts.find((part) => part.ref === ref)?.kind;
  const element = kind && partKinds[kind].running?.melts;
  const { melting = Infinity, rating = Infinity } = oven.values[ref] ?? {};
  const wrong = state.faults.find((fault) => fault.on === ref && fault.fault === 'wrong-rating');
  const usual = kind && partKinds[kind].faults.find(({ id }) => id === 'wrong-rating');
  const fitted = wrong
    ? (wrong.values?.['amps'] ?? usual?.parameters?.['amps']?.usual ?? rating)
    : rating;
  const size = fitted / rating;
  // Of one make, the melting integral goes with the square of the rating.
  return meltingTime(ran.current(`${ref}:${element}`), melting * square(size), fitted);
}

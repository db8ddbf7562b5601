import type { OvenState } from '../../../shared/oven/oven-state.ts';

/** Lead ends whose connectors sit on a terminal, in the order of the oven. */
export const seatedEnds = (oven: OvenState, terminal: string): string[] =>
  Object.keys(oven.leadEnds).filter((end) => oven.leadEnds[end] === terminal);

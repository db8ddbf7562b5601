import type { ProbeHold } from '../../../shared/bench/record.ts';

/** Behind a probe and where it is; the handle is the usual and needs no word. */
export const holdWords: Readonly<Record<ProbeHold, string>> = {
  handle: '',
  clip: ', through a clip lead',
  fingers: ', tip in the fingers',
};

/** As choices, the usual first: in full, and where there is little room. */
export const holdChoices = [
  ['handle', 'by the handle', 'handle'],
  ['clip', 'with a clip lead', 'clip'],
  ['fingers', 'fingers on the tip', 'fingers'],
] as const satisfies readonly (readonly [ProbeHold, string, string])[];

/** Before what a tip is on, where what stands last may not be seen. */
export const heldFirst: Readonly<Record<ProbeHold, string>> = {
  handle: '',
  clip: 'clip lead, ',
  fingers: 'in fingers, ',
};

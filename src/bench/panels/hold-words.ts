import type { ProbeHold } from '../../../shared/bench/record.ts';

/** Behind a probe and where it is; the handle is the usual and needs no word. */
export const holdWords: Readonly<Record<ProbeHold, string>> = {
  handle: '',
  clip: ', through a clip lead',
  fingers: ', tip in the fingers',
};

/** As choices, the usual first. */
export const holdChoices = [
  ['handle', 'handle'],
  ['clip', 'clip lead'],
  ['fingers', 'fingers'],
] as const satisfies readonly (readonly [ProbeHold, string])[];

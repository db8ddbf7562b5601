import type { SymbolOf } from './symbol.ts';

/** As the service data has it: a to k. Which way round it was fitted is for the eye and the meter. */
export const hvDiode: SymbolOf = () => ({
  size: [60, 20],
  body: { at: [10, 0], size: [40, 20] },
  terminals: { a: [0, 10], k: [60, 10] },
  strokes: () => [{ d: 'M0 10H60' }, { d: 'M20 1L40 10L20 19Z' }, { d: 'M40 1V19', kind: 'heavy' }],
});

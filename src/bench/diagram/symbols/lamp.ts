import type { SymbolOf } from './symbol.ts';

/** A circle with a cross. */
export const lamp: SymbolOf = () => ({
  size: [60, 40],
  body: { at: [10, 0], size: [40, 40] },
  terminals: { '1': [0, 20], '2': [60, 20] },
  strokes: () => [
    { d: 'M15 20a15 15 0 1 0 30 0a15 15 0 1 0 -30 0zM0 20H15M45 20H60' },
    { d: 'M19.4 9.4l21.2 21.2M40.6 9.4l-21.2 21.2', kind: 'fine' },
  ],
});

import type { SymbolOf } from './symbol.ts';

/** A fuse, long, with the bar of its ferrule at each end. */
export const hvFuse: SymbolOf = () => ({
  size: [60, 20],
  body: { at: [10, 0], size: [40, 20] },
  terminals: { '1': [0, 10], '2': [60, 10] },
  strokes: () => [
    { d: 'M11 3h38v14h-38z' },
    { d: 'M16 3v14M44 3v14', kind: 'fine' },
    { d: 'M0 10H60' },
  ],
});

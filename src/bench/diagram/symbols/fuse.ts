import type { SymbolOf } from './symbol.ts';

/** A fuse: a rectangle with its line through it. Whether it has blown is not to be seen. */
export const fuse: SymbolOf = () => ({
  size: [60, 20],
  body: { at: [10, 0], size: [40, 20] },
  terminals: { '1': [0, 10], '2': [60, 10] },
  strokes: () => [{ d: 'M12 3h36v14h-36z' }, { d: 'M0 10H60' }],
});

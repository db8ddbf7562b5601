import type { SymbolOf } from './symbol.ts';

export const resistor: SymbolOf = () => ({
  size: [60, 20],
  body: { at: [10, 0], size: [40, 20] },
  terminals: { '1': [0, 10], '2': [60, 10] },
  strokes: () => [{ d: 'M12 4h36v12h-36z' }, { d: 'M0 10H12M48 10H60' }],
});

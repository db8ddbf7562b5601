import type { PartSymbol, SymbolOf } from './symbol.ts';

const oneSpeed: PartSymbol = {
  size: [60, 40],
  body: { at: [10, 0], size: [40, 40] },
  terminals: { '1': [0, 20], '2': [60, 20] },
  strokes: () => [{ d: 'M13 20a17 17 0 1 0 34 0a17 17 0 1 0 -34 0zM0 20H13M47 20H60' }],
  letters: [{ text: 'M', at: [30, 20], size: 15 }],
};

/** The high speed at 1, the low speed at 3. */
const twoSpeeds: PartSymbol = {
  size: [80, 60],
  body: { at: [10, 0], size: [60, 60] },
  terminals: { '1': [0, 10], '2': [80, 30], '3': [0, 50] },
  strokes: () => [{ d: 'M16 30a24 24 0 1 0 48 0a24 24 0 1 0 -48 0zM64 30H80M0 10H26.7M0 50H26.7' }],
  letters: [{ text: 'M', at: [40, 30], size: 17 }],
};

export const motor: SymbolOf = (variant) => (variant === 'vent-fan' ? twoSpeeds : oneSpeed);

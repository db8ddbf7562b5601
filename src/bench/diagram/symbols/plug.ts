import type { SymbolOf } from './symbol.ts';

const pin = (y: number): string => `M6 ${y - 3}h14v6h-14z`;

export const plug: SymbolOf = () => ({
  size: [40, 120],
  body: { at: [0, 0], size: [30, 120] },
  terminals: { L: [40, 20], N: [40, 60], E: [40, 100] },
  strokes: () => [
    { d: 'M26 4v112h-22q-4 0-4-4v-104q0-4 4-4z', kind: 'dashed' },
    { d: pin(20) + pin(60) + pin(100), kind: 'filled' },
    { d: 'M20 20H40M20 60H40M20 100H40' },
  ],
});

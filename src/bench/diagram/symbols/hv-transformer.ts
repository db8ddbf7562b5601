import { chassisMark } from './chassis-mark.ts';
import type { SymbolOf } from './symbol.ts';
import { windingDown } from './winding.ts';

/** Primary left, heater winding and high-voltage winding right; the far end of the latter is on the core. */
export const hvTransformer: SymbolOf = () => ({
  size: [100, 180],
  body: { at: [10, 0], size: [80, 170] },
  terminals: {
    '1': [0, 50],
    '2': [0, 110],
    H1: [100, 10],
    H2: [100, 50],
    HV: [100, 80],
    core: [50, 180],
  },
  strokes: () => [
    { d: `M0 50H34${windingDown(34, 50, 6, 'right')}M34 110H0` },
    { d: `M100 10H66${windingDown(66, 10, 4, 'left')}M66 50H100` },
    { d: `M100 80H66${windingDown(66, 80, 7, 'left')}M66 150V157H50` },
    { d: 'M47 6V152M53 6V152', kind: 'heavy' },
    { d: 'M50 152V180M50 157H30V160' },
    chassisMark([30, 160]),
  ],
});

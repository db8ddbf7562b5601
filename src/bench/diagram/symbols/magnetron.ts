import { chassisMark } from './chassis-mark.ts';
import type { SymbolOf } from './symbol.ts';

/** A tube: the heater that is its cathode, and the anode that is its body. */
export const magnetron: SymbolOf = () => ({
  size: [80, 100],
  body: { at: [10, 0], size: [70, 90] },
  terminals: { '1': [0, 20], '2': [0, 60], body: [40, 100] },
  strokes: () => [
    { d: 'M11 40a34 34 0 1 0 68 0a34 34 0 1 0 -68 0z' },
    { d: 'M0 20H34L44 40L34 60H0' },
    { d: 'M60 20V60', kind: 'heavy' },
    { d: 'M60 60V80M60 77H40V100' },
    chassisMark([60, 80]),
  ],
});

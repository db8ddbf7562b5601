import { chassisMark } from './chassis-mark.ts';
import type { SymbolOf } from './symbol.ts';
import { windingDown } from './winding.ts';

export const boardTransformer: SymbolOf = () => ({
  size: [80, 130],
  body: { at: [10, 0], size: [60, 120] },
  terminals: {
    '1': [0, 30],
    '2': [0, 90],
    '3': [80, 10],
    '4': [80, 50],
    '5': [80, 70],
    '6': [80, 110],
    core: [40, 130],
  },
  strokes: () => [
    { d: `M0 30H28${windingDown(28, 30, 6, 'right')}M28 90H0` },
    { d: `M80 10H52${windingDown(52, 10, 4, 'left')}M52 50H80` },
    { d: `M80 70H52${windingDown(52, 70, 4, 'left')}M52 110H80` },
    { d: 'M38 6V110M42 6V110', kind: 'heavy' },
    { d: 'M40 110V130M40 112H29' },
    chassisMark([22, 112]),
  ],
});

import type { SymbolOf } from './symbol.ts';

const width = 1060;
const hatch = Array.from({ length: width / 20 }, (_, i) => `M${i * 20 + 12} 14l-6 6`).join('');

/** The chassis bar along the foot of the diagram; its points stand where leads come down to them. */
export const chassis: SymbolOf = () => ({
  size: [width, 20],
  body: { at: [0, 10], size: [width, 10] },
  terminals: { '1': [40, 0], '2': [960, 0], '3': [1040, 0] },
  strokes: () => [
    { d: `M0 13H${width}`, kind: 'heavy' },
    { d: hatch, kind: 'fine' },
    { d: 'M40 0V13M960 0V13M1040 0V13' },
  ],
});

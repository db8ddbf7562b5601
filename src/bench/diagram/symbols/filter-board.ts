import { windingAcross } from './winding.ts';
import type { SymbolOf } from './symbol.ts';

/** Two chokes; a capacitor and its bleeder across the input; a small capacitor from each output to chassis. */
export const filterBoard: SymbolOf = () => ({
  size: [120, 100],
  body: { at: [10, 0], size: [100, 100] },
  terminals: { '1': [0, 20], '2': [0, 80], '3': [120, 20], '4': [120, 80] },
  strokes: () => [
    { d: 'M12 3h96v94h-96z', kind: 'dashed' },
    { d: `M0 20H56${windingAcross(56, 20, 3)}M86 20H120` },
    { d: `M0 80H56${windingAcross(56, 80, 3)}M86 80H120` },
    { d: 'M24 20V47M24 53V80M17 47h14M17 53h14', kind: 'fine' },
    { d: 'M44 20V38M44 62V80M39 38h10v24h-10z', kind: 'fine' },
    { d: 'M98 20V31M92 31h12M92 35h12M98 35V65M92 65h12M92 69h12M98 69V80M98 50H84', kind: 'fine' },
    { d: 'M84 43V57M84 44l-6 4M84 50l-6 4M84 56l-6 4', kind: 'fine' },
  ],
});

import { bladeLift, makeContact } from './contact.ts';
import type { SymbolOf } from './symbol.ts';

/** Main contact 1-2 and power contact 2-3 on the cams of one motor. */
export const mechanicalTimer: SymbolOf = () => ({
  size: [120, 110],
  body: { at: [10, 0], size: [100, 100] },
  terminals: { '1': [0, 70], '2': [60, 110], '3': [120, 70], M1: [0, 20], M2: [120, 20] },
  strokes: ({ main = false, power = true }) => [
    ...makeContact({ from: 0, y: 70 }, main),
    ...makeContact({ from: 60, y: 70 }, power),
    { d: 'M60 70V110' },
    { d: 'M60 70m-2.5 0a2.5 2.5 0 1 0 5 0a2.5 2.5 0 1 0 -5 0z', kind: 'filled' },
    {
      d: `M31 ${70 - bladeLift('make', main)}V44H91V${70 - bladeLift('make', power)}M60 34V44`,
      kind: 'dashed',
    },
    { d: 'M46 20a14 14 0 1 0 28 0a14 14 0 1 0 -28 0zM0 20H46M74 20H120' },
    { d: 'M12 3h96v94h-96z', kind: 'dashed' },
  ],
  letters: [{ text: 'M', at: [60, 20], size: 14 }],
});

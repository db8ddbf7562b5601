import { bladeLift, makeContact } from './contact.ts';
import type { SymbolOf } from './symbol.ts';

/** A make contact and the coil that pulls it in. */
export const relay: SymbolOf = () => ({
  size: [60, 80],
  body: { at: [10, 0], size: [40, 80] },
  terminals: { '1': [0, 20], '2': [60, 20], A1: [0, 70], A2: [60, 70] },
  strokes: ({ contact = false }) => [
    ...makeContact({ from: 0, y: 20 }, contact),
    { d: `M31 ${20 - bladeLift('make', contact)}V61`, kind: 'dashed' },
    { d: 'M16 61h30v17h-30zM0 70H16M46 70H60' },
  ],
});

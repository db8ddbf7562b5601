import { breakContact } from './contact.ts';
import type { SymbolOf } from './symbol.ts';

/** A contact opened by temperature. Which way it stands is not to be seen, so it is drawn as it is when cold: closed. */
export const cutOut: SymbolOf = () => ({
  size: [60, 30],
  body: { at: [10, 0], size: [40, 30] },
  terminals: { '1': [0, 20], '2': [60, 20] },
  strokes: () => breakContact({ from: 0, y: 20 }, true),
  letters: [{ text: 'θ', at: [27, 5], size: 12 }],
});

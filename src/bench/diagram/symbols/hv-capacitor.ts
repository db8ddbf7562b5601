import { chassisMark } from './chassis-mark.ts';
import type { SymbolOf } from './symbol.ts';

/** Two plates with the bleeder across them, in a can that is bolted to the chassis. */
export const hvCapacitor: SymbolOf = () => ({
  size: [80, 70],
  body: { at: [10, 0], size: [60, 60] },
  terminals: { '1': [0, 20], '2': [80, 20], can: [40, 70] },
  strokes: () => [
    { d: 'M0 20H36M44 20H80' },
    { d: 'M36 8V32M44 8V32', kind: 'heavy' },
    { d: 'M19 20V41H29M29 37h22v8h-22zM51 41H61V20', kind: 'fine' },
    { d: 'M12 2h56v47h-56z', kind: 'dashed' },
    { d: 'M40 49V70M40 52H50' },
    chassisMark([57, 52]),
  ],
});

import { bladeLift, breakContact, makeContact } from './contact.ts';
import type { SymbolOf } from './symbol.ts';

/** A contact worked by the door's hook: the lever over it comes down with the blade. */
export const doorSwitch: SymbolOf = (variant) => {
  const isBreak = variant === 'monitor';
  return {
    size: [60, 40],
    body: { at: [10, 0], size: [40, 40] },
    terminals: { COM: [0, 30], [isBreak ? 'NC' : 'NO']: [60, 30] },
    strokes: ({ contact = false }) => {
      const top = isBreak ? (contact ? 2 : 0) : contact ? 9 : 2;
      const lift = bladeLift(isBreak ? 'break' : 'make', contact);
      return [
        ...(isBreak ? breakContact : makeContact)({ from: 0, y: 30 }, contact),
        { d: `M31 ${30 - lift}V${top}`, kind: 'dashed' },
        { d: `M22 ${top + 4}l9 -4l9 4`, kind: 'fine' },
      ];
    },
  };
};

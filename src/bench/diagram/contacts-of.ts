import type { OvenPart } from '../../../shared/oven/oven.ts';
import type { OvenState } from '../../../shared/oven/oven-state.ts';
import type { Contacts } from './symbols/symbol.ts';

/**
 * How the contacts of a part stand, as far as anybody can see: by its lever, its knob, what pulls it
 * in. A welded contact, a blown fuse, a cut-out that has opened are for the meter to find.
 */
export function contactsOf(part: OvenPart, oven: OvenState): Contacts {
  const isHeld = oven.pressed.includes(part.ref);
  const isSwitchedOn = oven.energised.includes(part.ref);
  switch (part.kind) {
    case 'door-switch': {
      const isActuated = oven.isDoorClosed || isHeld;
      return { contact: part.variant === 'monitor' ? !isActuated : isActuated };
    }
    case 'relay':
      return { contact: isSwitchedOn };
    case 'mechanical-timer':
      return { main: isSwitchedOn || isHeld, power: true };
    case 'plug':
    case 'chassis':
    case 'fuse':
    case 'filter-board':
    case 'cut-out':
    case 'board-transformer':
    case 'control-board':
    case 'resistor':
    case 'lamp':
    case 'motor':
    case 'hv-transformer':
    case 'hv-fuse':
    case 'hv-capacitor':
    case 'hv-diode':
    case 'magnetron':
      return {};
  }
}

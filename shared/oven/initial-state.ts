import type { AppliedFault } from './fault.ts';
import { seatsAfter } from './misplaced-leads.ts';
import type { OvenDefinition } from './oven.ts';
import type { OvenState } from './oven-state.ts';

/**
 * The oven as it comes in: door closed, nothing pressed, every lead where it belongs except those
 * that an earlier repair left off or put elsewhere.
 */
export function asFitted(definition: OvenDefinition, faults: readonly AppliedFault[]): OvenState {
  return {
    faults,
    leadEnds: seatsAfter(definition, faults),
    isDoorClosed: true,
    pressed: [],
    opened: [],
    energised: [],
    cleaned: [],
  };
}

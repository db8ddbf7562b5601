import type { AppliedFault } from './fault.ts';
import type { LeadEndRef, OvenDefinition, TerminalRef } from './oven.ts';
import type { OvenState } from './oven-state.ts';

const sides = ['a', 'b'] as const;

/**
 * The oven as it comes in: door closed, nothing pressed, every lead where it belongs except those
 * that a fault left off.
 */
export function asFitted(definition: OvenDefinition, faults: readonly AppliedFault[]): OvenState {
  const isOff = (lead: string, side: string) =>
    faults.some((fault) => fault.on === lead && fault.fault === `off-${side}`);
  const ends = definition.leads.flatMap((lead) =>
    sides.map((side, index): [LeadEndRef, TerminalRef | null] => [
      `${lead.ref}/${side}`,
      isOff(lead.ref, side) ? null : (lead.ends[index] ?? null),
    ]),
  );
  return {
    faults,
    leadEnds: Object.fromEntries(ends),
    isDoorClosed: true,
    pressed: [],
    opened: [],
    energised: [],
    cleaned: [],
  };
}

import type { AppliedFault } from '../oven/fault.ts';
import { leadFaults } from '../oven/lead-faults.ts';
import type { OvenDefinition } from '../oven/oven.ts';
import { partKinds } from '../oven/parts/catalogue.ts';

/** Every fault of every part and lead of an oven, each with its usual values, in the order of the definition. */
export function singleFaults(definition: OvenDefinition): AppliedFault[] {
  const ofParts = definition.parts.flatMap(({ ref, kind }) =>
    partKinds[kind].faults.map(({ id }) => ({ on: ref, fault: id })),
  );
  const ofLeads = definition.leads.flatMap(({ ref }) =>
    leadFaults.map(({ id }) => ({ on: ref, fault: id })),
  );
  return [...ofParts, ...ofLeads];
}

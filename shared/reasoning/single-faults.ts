import { faultsOf } from '../oven/check-faults.ts';
import type { AppliedFault } from '../oven/fault.ts';
import type { OvenDefinition } from '../oven/oven.ts';

/** Every fault of every part and lead of an oven, each with its usual values, in the order of the definition. */
export const singleFaults = (definition: OvenDefinition): AppliedFault[] =>
  [...definition.parts, ...definition.leads].flatMap(({ ref }) =>
    (faultsOf(definition, ref) ?? []).map(({ id }) => ({ on: ref, fault: id })),
  );

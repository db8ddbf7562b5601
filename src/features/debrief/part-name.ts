import { faultsOf } from '../../../shared/oven/check-faults.ts';
import type { OvenDefinition } from '../../../shared/oven/oven.ts';

/** "C1, high-voltage capacitor" or "W12, neutral to S2"; the reference alone when the oven is not here. */
export const partName = (definition: OvenDefinition | undefined, ref: string): string => {
  const known = [...(definition?.parts ?? []), ...(definition?.leads ?? [])];
  const found = known.find((one) => one.ref === ref);
  return found ? `${ref}, ${found.name}` : ref;
};

export const faultName = (
  definition: OvenDefinition | undefined,
  ref: string,
  fault: string,
): string =>
  (definition ? faultsOf(definition, ref) : null)?.find(({ id }) => id === fault)?.name ?? fault;

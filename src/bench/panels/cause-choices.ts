import { faultsOf } from '../../../shared/oven/check-faults.ts';
import type { OvenDefinition } from '../../../shared/oven/oven.ts';

export interface FaultChoice {
  id: string;
  name: string;
}

/** What can be wrong with a part or a lead of this oven, as its kind lists it. */
export function faultChoices(definition: OvenDefinition, on: string): readonly FaultChoice[] {
  return faultsOf(definition, on) ?? [];
}

/** `C1 high-voltage capacitor: shorted` */
export function causeText(
  definition: OvenDefinition,
  { on, fault }: { on: string; fault: string },
): string {
  const thing = [...definition.parts, ...definition.leads].find(({ ref }) => ref === on);
  const name = faultChoices(definition, on).find(({ id }) => id === fault)?.name ?? fault;
  return `${on} ${thing?.name ?? ''}: ${name}`;
}

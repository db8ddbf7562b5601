import { faultsOf } from '../../../shared/oven/check-faults.ts';
import type { FaultKind } from '../../../shared/oven/fault.ts';
import type { OvenDefinition } from '../../../shared/oven/oven.ts';
import type { ScenarioContent } from '../../../shared/scenario/scenario.ts';

/** The usual value of each parameter of a fault, as the circuit takes it when none is given. */
export const usualValues = (kind: FaultKind | undefined): Record<string, number> | undefined =>
  kind?.parameters &&
  Object.fromEntries(Object.entries(kind.parameters).map(([name, { usual }]) => [name, usual]));

/** The draft with every value written out, so that a form has something to show and compare. */
export const withUsualValues = (
  draft: ScenarioContent,
  definition: OvenDefinition,
): ScenarioContent => ({
  ...draft,
  faults: draft.faults.map((applied) => {
    const kind = faultsOf(definition, applied.on)?.find(({ id }) => id === applied.fault);
    const usual = usualValues(kind);
    return usual ? { ...applied, values: { ...usual, ...applied.values } } : applied;
  }),
});

import type { AppliedFault, FaultKind } from './fault.ts';
import { leadFaults } from './lead-faults.ts';
import type { OvenDefinition } from './oven.ts';
import { partKinds } from './parts/catalogue.ts';
import type { Problem } from './problem.ts';
import { unknownName } from './problem.ts';

/** The faults a part or a lead of this oven can have; null when the oven has no such part or lead. */
export function faultsOf(definition: OvenDefinition, ref: string): readonly FaultKind[] | null {
  const part = definition.parts.find((candidate) => candidate.ref === ref);
  if (part) return partKinds[part.kind].faults;
  return definition.leads.some((lead) => lead.ref === ref) ? leadFaults : null;
}

/** What is wrong with faults applied to this oven: unknown parts, faults and parameters, values out of range. */
export function checkFaults(
  definition: OvenDefinition,
  faults: readonly AppliedFault[],
): Problem[] {
  const refs = [...definition.parts, ...definition.leads].map(({ ref }) => ref);
  return faults.flatMap((applied, index) => {
    const path = `faults.${index}`;
    const kinds = faultsOf(definition, applied.on);
    if (!kinds) return [unknownName('part or lead', applied.on, refs, `${path}.on`)];
    const ids = kinds.map(({ id }) => id);
    const kind = kinds.find(({ id }) => id === applied.fault);
    if (!kind) return [unknownName('fault', applied.fault, ids, `${path}.fault`)];
    const declared = kind.parameters ?? {};
    return Object.entries(applied.values ?? {}).flatMap(([name, value]) => {
      const at = `${path}.values.${name}`;
      const limits = declared[name];
      if (!limits) return [unknownName('parameter', name, Object.keys(declared), at)];
      const { min, max, unit } = limits;
      return value >= min && value <= max
        ? []
        : [{ path: at, message: `${name} ${value} ${unit} is outside ${min} to ${max}` }];
    });
  });
}

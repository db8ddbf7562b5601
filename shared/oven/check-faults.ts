import type { AppliedFault, FaultKind } from './fault.ts';
import { leadFaults } from './lead-faults.ts';
import { homes, isPossible } from './misplaced-leads.ts';
import type { OvenDefinition } from './oven.ts';
import { partKinds } from './parts/catalogue.ts';
import type { Problem } from './problem.ts';
import { unknownName } from './problem.ts';
import { terminalsOf } from './targets.ts';

/** The faults a part or a lead of this oven can have; null when the oven has no such part or lead. */
export function faultsOf(definition: OvenDefinition, ref: string): readonly FaultKind[] | null {
  const part = definition.parts.find((candidate) => candidate.ref === ref);
  if (part) {
    const { faults, usual } = partKinds[part.kind];
    const variant = part.variant ?? usual ?? '';
    return faults.filter(({ variants }) => variants?.includes(variant) ?? true);
  }
  return definition.leads.some((lead) => lead.ref === ref)
    ? leadFaults.filter(({ id }) => isPossible(definition, ref, id))
    : null;
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
    const others = otherProblems(definition, applied, kind, `${path}.other`);
    const values = Object.entries(applied.values ?? {}).flatMap(([name, value]) => {
      const at = `${path}.values.${name}`;
      const limits = declared[name];
      if (!limits) return [unknownName('parameter', name, Object.keys(declared), at)];
      const { min, max, unit } = limits;
      return value >= min && value <= max
        ? []
        : [{ path: at, message: `${name} ${value} ${unit} is outside ${min} to ${max}` }];
    });
    return [...others, ...values];
  });
}

/** A misplaced lead names a terminal or a lead end that the oven has; other faults name none. */
function otherProblems(
  definition: OvenDefinition,
  { fault, other }: AppliedFault,
  kind: FaultKind,
  path: string,
): Problem[] {
  if (other === undefined) return [];
  if (!kind.other) return [{ path, message: `${fault} has no other ${other}` }];
  const known =
    kind.other === 'terminal'
      ? terminalsOf(definition).map(({ ref }) => ref)
      : [...homes(definition).keys()];
  return known.includes(other) ? [] : [unknownName(kind.other, other, known, path)];
}

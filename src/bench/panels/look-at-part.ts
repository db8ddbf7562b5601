import type { BenchState } from '../../../shared/bench/bench-state.ts';
import { leadFaults } from '../../../shared/oven/lead-faults.ts';
import type { OvenDefinition } from '../../../shared/oven/oven.ts';
import { partKinds } from '../../../shared/oven/parts/catalogue.ts';

/** What a look from close shows on a part and on the connectors that belong on it. Empty: nothing unusual. */
export function lookAtPart(definition: OvenDefinition, state: BenchState, ref: string): string[] {
  const part = definition.parts.find((one) => one.ref === ref);
  if (!part) return [];
  const { faults } = state.oven;
  const own = faults
    .filter((fault) => fault.on === ref)
    .map(({ fault }) => partKinds[part.kind].faults.find(({ id }) => id === fault)?.look);
  const onLeads = definition.leads.flatMap((lead) =>
    lead.ends.flatMap((terminal, i) => {
      if (terminal.split('.')[0] !== ref) return [];
      const side = i === 0 ? 'a' : 'b';
      return faults
        .filter(({ on, fault }) => on === lead.ref && fault.endsWith(`-${side}`))
        .map(({ fault }) => leadLook(fault, `${lead.ref}/${side}`));
    }),
  );
  return [...own, ...onLeads].filter((look) => look !== undefined);
}

const leadLook = (fault: string, end: string): string | undefined => {
  const look = leadFaults.find(({ id }) => id === fault)?.look;
  return look && `${end}: ${look}`;
};

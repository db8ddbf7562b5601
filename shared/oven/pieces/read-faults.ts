import type { AppliedFault, FaultKind } from '../fault.ts';

export interface FaultReader {
  has: (id: string) => boolean;
  /** SI; the applied value, or the usual one where the scenario gives none; NaN-free by the catalogue's own test */
  value: (id: string, parameter: string) => number;
}

/** Reads the faults applied to one part by what its kind declares. */
export function readFaults(
  kinds: readonly FaultKind[],
  applied: readonly AppliedFault[],
): FaultReader {
  const find = (id: string) => applied.find((fault) => fault.fault === id);
  return {
    has: (id) => find(id) !== undefined,
    value: (id, parameter) => {
      const declared = kinds.find((kind) => kind.id === id)?.parameters?.[parameter];
      if (!declared) throw new Error(`fault ${id} declares no ${parameter}`);
      return find(id)?.values?.[parameter] ?? declared.usual;
    },
  };
}

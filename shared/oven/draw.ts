import { seededUniform } from '../engine/quantities/seeded-uniform.ts';
import type { OvenDefinition, OvenPart } from './oven.ts';
import type { DrawnOven } from './oven-state.ts';
import { partKinds } from './parts/catalogue.ts';

function drawPart(part: OvenPart, seed: number): Record<string, number> {
  const entries = Object.entries(partKinds[part.kind].values).map(([name, value]) => {
    const nominal = part.values?.[name] ?? value.nominal;
    const spread = 2 * seededUniform(seed, `${part.ref}.${name}`) - 1;
    return [name, nominal * (1 + value.tolerance * spread)] as const;
  });
  return Object.fromEntries(entries);
}

/**
 * The oven of one attempt: every value of every part, SI units, uniform within its tolerance.
 * The same seed gives the same oven for ever; a part added later changes no other.
 */
export function drawOven(definition: OvenDefinition, seed: number): DrawnOven {
  const values = definition.parts.map((part) => [part.ref, drawPart(part, seed)] as const);
  return { definition, seed, values: Object.fromEntries(values) };
}

/** The oven with every value at its nominal: for worked numbers and service data. */
export function nominalOven(definition: OvenDefinition): DrawnOven {
  const values = definition.parts.map((part) => {
    const entries = Object.entries(partKinds[part.kind].values);
    const nominal = entries.map(([name, value]) => [name, part.values?.[name] ?? value.nominal]);
    return [part.ref, Object.fromEntries(nominal) as Record<string, number>] as const;
  });
  return { definition, seed: -1, values: Object.fromEntries(values) };
}

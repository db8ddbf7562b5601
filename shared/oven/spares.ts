import type { AppliedFault } from './fault.ts';
import type { OvenDefinition, OvenPart, PartRef } from './oven.ts';
import type { Spares } from './part-kind.ts';
import { partKinds } from './parts/catalogue.ts';

/** What sizes a new part of this kind can be had in; undefined: in one. */
export const sparesOf = ({ kind }: OvenPart): Spares | undefined => partKinds[kind].spares;

/** The size that belongs in this oven, SI units; undefined: the kind has none. */
export function ownSize(part: OvenPart): number | undefined {
  const spares = sparesOf(part);
  return (
    spares && (part.values?.[spares.value] ?? partKinds[part.kind].values[spares.value]?.nominal)
  );
}

/** The fault that a spare of this size is: none when the size is the oven's own, or none was chosen. */
export function wrongSize(
  definition: OvenDefinition,
  ref: PartRef,
  size: number | undefined,
): AppliedFault[] {
  const part = definition.parts.find((one) => one.ref === ref);
  const spares = part && sparesOf(part);
  if (!spares || size === undefined || size === ownSize(part)) return [];
  const { fault, parameter } = spares.wrongSize;
  return [{ on: ref, fault, values: { [parameter]: size } }];
}

import type { OvenLayout } from './layout.ts';
import type { OvenDefinition } from './oven.ts';
import { unknownName, type Problem } from './problem.ts';

/** Every part has a place in the wiring diagram, and nothing else has. Paths begin in the layout file. */
export function checkDiagram(definition: OvenDefinition, { diagram }: OvenLayout): Problem[] {
  const known = definition.parts.map(({ ref }) => ref);
  const placed = Object.keys(diagram.parts);
  return [
    ...known
      .filter((ref) => !placed.includes(ref))
      .map((ref) => ({
        path: `diagram.parts.${ref}`,
        message: `${ref} has no place in the wiring diagram`,
      })),
    ...placed
      .filter((ref) => !known.includes(ref))
      .map((ref) => unknownName('part', ref, known, `diagram.parts.${ref}`)),
    ...Object.entries(diagram.parts)
      .filter(([, { at }]) => at[0] >= diagram.size[0] || at[1] >= diagram.size[1])
      .map(([ref]) => ({
        path: `diagram.parts.${ref}.at`,
        message: `${ref} lies outside of the diagram's ${diagram.size.join(' by ')} units`,
      })),
  ];
}

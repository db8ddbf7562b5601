import type { OvenDefinition } from './oven.ts';

/** Whether this oven tells by a display that it has power; one with a timer tells nothing until it runs. */
export const hasDisplay = (definition: OvenDefinition): boolean =>
  definition.parts.some(({ kind }) => kind === 'control-board');

import type { DrawnOven } from '../../oven/oven-state.ts';

/** What a control board pulls a relay in for; a relay that names nothing is for cooking. */
export type RelayUse = 'cook' | 'vent-high' | 'vent-low' | 'cooktop-lamp';

/** The relays of this oven that the board pulls in for these uses. */
export const relaysFor = (oven: DrawnOven, uses: readonly RelayUse[]): string[] =>
  oven.definition.parts
    .filter(
      ({ kind, variant }) => kind === 'relay' && uses.some((use) => use === (variant ?? 'cook')),
    )
    .map(({ ref }) => ref);

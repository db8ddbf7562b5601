/** `['draft', 'faults', 0, 'on']` as `draft.faults.0.on`. */
export const jsonPath = (keys: readonly PropertyKey[]): string => keys.map(String).join('.');

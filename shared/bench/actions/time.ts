import { z } from 'zod';
import { accept, action } from '../action.ts';

/** ms */
export const waitLimits = { shortest: 1000, longest: 600_000 } as const;

const waited = z.strictObject({
  ms: z.int().min(waitLimits.shortest).max(waitLimits.longest),
});

/** Bench time that nobody sat through: its event stands at the end of the wait. */
export const wait = action({
  command: 'Wait',
  event: 'TimePassed',
  input: waited,
  data: waited,
  decide: (_bench, data) => accept(data),
  evolve: (state) => state,
  describe: ({ ms }) => `waited ${ms < 60_000 ? `${ms / 1000} s` : `${ms / 60_000} min`}`,
});

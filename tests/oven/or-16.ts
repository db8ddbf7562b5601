import { readFileSync } from 'node:fs';
import { asFitted } from '../../shared/oven/initial-state.ts';
import { nominalOven } from '../../shared/oven/draw.ts';
import type { AppliedFault } from '../../shared/oven/fault.ts';
import type { OvenDefinition } from '../../shared/oven/oven.ts';
import type { OvenState } from '../../shared/oven/oven-state.ts';
import { parseOven } from '../../shared/oven/parse-oven.ts';

const file = new URL('../../scenarios/ovens/brackwell-or-16.json', import.meta.url);

function load(): OvenDefinition {
  const parsed = parseOven(JSON.parse(readFileSync(file, 'utf8')));
  if (!parsed.ok)
    throw new Error(parsed.problems.map(({ path, message }) => `${path}: ${message}`).join('\n'));
  return parsed.oven;
}

/** The over-the-range oven. */
export const or16 = load();
export const or16Nominal = nominalOven(or16);

/** Door open, nothing lifted unless said. */
export function or16Cold(
  change: Partial<OvenState> & { lift?: readonly string[] } = {},
  faults: readonly AppliedFault[] = [],
): OvenState {
  const { lift = [], ...rest } = change;
  const fitted = asFitted(or16, faults);
  const leadEnds = { ...fitted.leadEnds, ...rest.leadEnds };
  for (const end of lift) leadEnds[end] = null;
  return { ...fitted, isDoorClosed: false, ...rest, leadEnds };
}

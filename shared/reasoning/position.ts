import { asFitted } from '../oven/initial-state.ts';
import type { OvenDefinition, ServiceMeasurement } from '../oven/oven.ts';
import type { OvenState } from '../oven/oven-state.ts';
import type { Candidate } from './candidate.ts';

/** What hands have done to the oven before a measurement: cord out, cover off, door open. */
export interface Position {
  readonly lifted: readonly string[];
  readonly cleaned: readonly string[];
  readonly pressed: readonly string[];
}

export const positionOf = ({
  lift,
  clean = [],
  press = [],
}: Pick<ServiceMeasurement, 'lift' | 'clean' | 'press'>): Position => ({
  lifted: lift,
  cleaned: clean,
  pressed: press,
});

/** Equal for positions that make the same circuit. */
export const positionKey = ({ lifted, cleaned, pressed }: Position): string =>
  [lifted, cleaned, pressed].map((list) => [...list].sort().join(' ')).join('|');

/** The oven of a candidate as it comes in: what the hands then do is a position. */
export const fitted = (definition: OvenDefinition, { faults, opened }: Candidate): OvenState => ({
  ...asFitted(definition, faults),
  isDoorClosed: false,
  opened,
});

/** A fitted oven with hands on it. */
export function inPosition(oven: OvenState, { lifted, cleaned, pressed }: Position): OvenState {
  const leadEnds = { ...oven.leadEnds };
  for (const end of lifted) leadEnds[end] = null;
  return { ...oven, leadEnds, pressed, cleaned };
}

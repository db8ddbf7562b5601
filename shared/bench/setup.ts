import { drawMeter } from '../instruments/draw-meter.ts';
import type { MeterDefinition, MeterUnit } from '../instruments/meter.ts';
import { meterById } from '../instruments/meters.ts';
import { drawOven } from '../oven/draw.ts';
import type { AppliedFault } from '../oven/fault.ts';
import type { DrawnOven } from '../oven/oven-state.ts';
import type { OvenDefinition } from '../oven/oven.ts';

/** Written into every attempt: which rules and circuit engine judged it. */
export const engineVersion = 4;

/** What does not change during an attempt: the drawn oven, its faults and the meter handed out. */
export interface Setup {
  oven: DrawnOven;
  faults: readonly AppliedFault[];
  meter: MeterDefinition;
  unit: MeterUnit;
  seed: number;
  /** s since the oven last ran when the attempt begins; null: not for days */
  lastRunSecondsAgo: number | null;
  /** guided practice: after a hazard the bench offers the way back */ mayStepBack: boolean;
}

export interface SetupInput {
  definition: OvenDefinition;
  faults: readonly AppliedFault[];
  meter: string;
  seed: number;
  lastRunSecondsAgo: number | null;
  condition: 'guided' | 'unaided' | 'assessed';
}

/** The same seed draws the same oven and the same meter for ever. */
export function makeSetup(input: SetupInput): Setup {
  const meter = meterById(input.meter);
  return {
    oven: drawOven(input.definition, input.seed),
    faults: input.faults,
    meter,
    unit: drawMeter(meter, input.seed),
    seed: input.seed,
    lastRunSecondsAgo: input.lastRunSecondsAgo,
    mayStepBack: input.condition === 'guided',
  };
}

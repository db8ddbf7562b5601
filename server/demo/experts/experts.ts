import type { Expert } from './expert.ts';
import { larkfieldHighVoltage } from './larkfield-high-voltage.ts';
import { larkfieldMains } from './larkfield-mains.ts';
import { overTheRange } from './over-the-range.ts';
import { timer } from './timer.ts';

/** Every expert, oven by oven. */
export const experts: readonly Expert[] = [
  ...larkfieldMains,
  ...larkfieldHighVoltage,
  ...timer,
  ...overTheRange,
];

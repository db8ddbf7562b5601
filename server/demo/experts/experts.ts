import type { Expert } from './expert.ts';
import { overTheRange } from './over-the-range.ts';

/** Every expert, oven by oven. */
export const experts: readonly Expert[] = [...overTheRange];
